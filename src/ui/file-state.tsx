import { Button } from './button.tsx';
import { RodProgress } from './rod-progress.tsx';

type FileStateProps = {
  /** What is being written, for who listens. */
  readonly title: string;
  readonly waiting: boolean;
  readonly saved: { readonly name: string; readonly address: string } | undefined;
  /** Why there is no file, in plain words. */
  readonly refused: string | undefined;
  readonly onCancel: () => void;
};

/** How a file that was asked for stands: being written, saved, or why there is none. */
export const FileState = ({ title, waiting, saved, refused, onCancel }: FileStateProps) => (
  <div role="status">
    {waiting && (
      <p className="mt-2 flex items-center gap-3 text-sm">
        <RodProgress label={`Writing: ${title}`} />
        Writing…
        <Button kind="quiet" className="min-h-8 px-2" onClick={onCancel}>
          Cancel
        </Button>
      </p>
    )}
    {saved !== undefined && (
      <p className="mt-2 text-sm text-verdigris">
        {`✓ saved as ${saved.name} `}
        <a className="text-brass underline" href={saved.address} target="_blank" rel="noreferrer">
          Open
        </a>
      </p>
    )}
    {refused !== undefined && <p className="mt-2 text-sm text-madder">{refused}</p>}
  </div>
);
