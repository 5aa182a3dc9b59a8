import type { Standing } from '../saver.ts';

const words: { readonly [S in Standing]: { readonly said: string; readonly look: string } } = {
  saved: { said: '✓ saved', look: 'text-verdigris' },
  waiting: { said: 'saving…', look: 'text-slate' },
  saving: { said: 'saving…', look: 'text-slate' },
  offline: { said: 'offline: kept here, sent later', look: 'text-brass' },
  'signed-out': { said: 'signed out: kept here', look: 'text-madder' },
  conflict: { said: 'saved elsewhere too: choose', look: 'text-madder' },
  refused: { said: 'not saved', look: 'text-madder' },
};

type SaveStateProps = {
  readonly saving: { readonly standing: Standing; readonly message?: string | undefined };
  /** Whether this browser keeps what the server has not got. */
  readonly kept: boolean;
};

/** How the work stands to the server, in two words that are always in sight. */
export const SaveState = ({ saving: { standing, message }, kept }: SaveStateProps) => {
  const { said, look } = words[standing];
  const lost = !kept && standing !== 'saved';
  return (
    <p
      role="status"
      data-standing={standing}
      title={message}
      className={`shrink-0 text-sm ${lost ? 'text-madder' : look}`}
    >
      {lost && standing === 'offline' ? 'offline: leave this page open' : said}
    </p>
  );
};
