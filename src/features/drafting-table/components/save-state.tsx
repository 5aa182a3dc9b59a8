import type { Standing } from '../saver.ts';

type Words = {
  readonly said: string;
  /** What there is room for on a wider screen, and always for who listens. */
  readonly more?: string;
  readonly look: string;
};

const words: { readonly [S in Standing]: Words } = {
  saved: { said: '✓ saved', look: 'text-verdigris' },
  waiting: { said: 'saving…', look: 'text-slate' },
  saving: { said: 'saving…', look: 'text-slate' },
  offline: { said: 'offline', more: ': kept here, sent later', look: 'text-brass' },
  'signed-out': { said: 'signed out', more: ': kept here', look: 'text-madder' },
  conflict: { said: 'saved elsewhere too', look: 'text-madder' },
  refused: { said: 'not saved', look: 'text-madder' },
};

type SaveStateProps = {
  readonly saving: { readonly standing: Standing; readonly message?: string | undefined };
  /** Whether this browser keeps what the server has not got. */
  readonly kept: boolean;
};

/** How the work stands to the server, in a few words that are always in sight. */
export const SaveState = ({ saving: { standing, message }, kept }: SaveStateProps) => {
  const { said, more, look } = words[standing];
  const held = kept || standing === 'saved';
  return (
    <p
      role="status"
      data-standing={standing}
      title={message}
      className={`shrink-0 text-sm whitespace-nowrap ${held ? look : 'text-madder'}`}
    >
      {said}
      <span className="max-sm:sr-only">{held ? more : ': leave this page open'}</span>
    </p>
  );
};
