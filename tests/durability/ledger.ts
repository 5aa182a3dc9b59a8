/** One save the server has acknowledged, and what it said. */
export type Acknowledgement = {
  readonly gownId: string;
  readonly saveId: string;
  readonly version: number;
  /** Counts a gown's saves from 1; it stands in the content as well. */
  readonly count: number;
};

/** What a maker's browser knows in the end. */
export type Ledger = {
  readonly acknowledged: readonly Acknowledgement[];
  readonly retries: number;
  /** Saves that were done at first, and answered only when they were sent again. */
  readonly unheard: number;
  /** Answers that no retry could mend: there should be none. */
  readonly refused: readonly string[];
};

/** What the browser's process tells while it saves, and at last. */
export type Word = { readonly acknowledged: number } | { readonly ledger: Ledger };
