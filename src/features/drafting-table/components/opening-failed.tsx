import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';

import { CallFailed } from '../../../lib/call.ts';
import { failureWords } from '../../../lib/failure-words.ts';
import { Button } from '../../../ui/button.tsx';
import { Notice } from '../../../ui/notice.tsx';
import { Aside } from './aside.tsx';

type OpeningFailedProps = {
  readonly what: 'gown' | 'measure card';
  readonly error: Error;
  /** Whether this browser holds work the server has not got. */
  readonly unsent: boolean;
  readonly signIn: (onSignedIn: () => void) => ReactNode;
  readonly onRetry: () => void;
};

/** A record that could not be fetched: sign in, or try again. */
export const OpeningFailed = ({ what, error, unsent, signIn, onRetry }: OpeningFailedProps) =>
  error instanceof CallFailed && error.code === 'not-signed-in' ? (
    <Aside title={`Sign in to open this ${what}`}>
      {unsent && (
        <p className="mb-4">
          What you changed last is kept in this browser and is saved once you are in.
        </p>
      )}
      {signIn(onRetry)}
    </Aside>
  ) : (
    <Aside title={`This ${what} did not open`}>
      <Notice>{failureWords(error)}</Notice>
      <p className="mt-4 flex gap-4">
        <Button onClick={onRetry}>Try again</Button>
        <Link to="/gowns" className="py-2 text-brass underline">
          To the gowns
        </Link>
      </p>
    </Aside>
  );

/** Whether what this browser holds may be opened although the server did not answer. */
export const mayOpenKept = (error: Error): boolean =>
  !(error instanceof CallFailed && ['not-signed-in', 'not-found'].includes(error.code));
