import { failureWords } from '../../../lib/failure-words.ts';
import { Button } from '../../../ui/button.tsx';
import { FileState } from '../../../ui/file-state.tsx';
import { RodProgress } from '../../../ui/rod-progress.tsx';
import type { PrintOrder } from '../queries.ts';
import { usePrint } from '../use-print.ts';

type PrintRowProps = {
  readonly title: string;
  readonly note: string;
  /** Not known while they are counted. */
  readonly sheets: string | undefined;
  readonly order: PrintOrder;
};

/** A number of sheets in words. */
export const countedSheets = (sheets: number): string =>
  sheets === 1 ? '1 sheet' : `${sheets} sheets`;

/** One thing to print: its sheets beside the button, then its progress, its file or why there is none. */
export const PrintRow = ({ title, note, sheets, order }: PrintRowProps) => {
  const print = usePrint();
  return (
    <section aria-label={title} className="border-b border-rule py-3">
      <div className="flex flex-wrap items-center justify-between gap-x-4 gap-y-1 sm:flex-nowrap">
        <p className="basis-full text-sm text-slate sm:basis-auto">{note}</p>
        <p className="figures ml-auto flex shrink-0 items-center gap-3">
          {sheets === undefined ? (
            <RodProgress label={`Counting the sheets: ${title}`} />
          ) : (
            <span>{sheets}</span>
          )}
          <Button
            kind="primary"
            className="w-32 px-2"
            disabled={print.waiting}
            onClick={() => print.order(order)}
          >
            {title}
          </Button>
        </p>
      </div>
      <FileState
        title={title}
        waiting={print.waiting}
        saved={print.saved}
        refused={print.refused === null ? undefined : failureWords(print.refused, order.unit)}
        onCancel={print.cancel}
      />
    </section>
  );
};
