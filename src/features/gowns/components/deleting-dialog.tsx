import { failureWords } from '../../../lib/failure-words.ts';
import { Button } from '../../../ui/button.tsx';
import { Dialog } from '../../../ui/dialog.tsx';
import { Notice } from '../../../ui/notice.tsx';
import type { DeedDoer } from '../queries.ts';

type DeletingDialogProps = {
  readonly name: string;
  /** What goes with it, one sentence. */
  readonly goes: string;
  readonly deed: DeedDoer;
  readonly onDelete: () => void;
  readonly onClose: () => void;
};

/** Names what goes, before it goes. */
export const DeletingDialog = ({ name, goes, deed, onDelete, onClose }: DeletingDialogProps) => (
  <Dialog title={`Delete ${name}?`} open onClose={onClose}>
    <p className="my-4">{goes}</p>
    {deed.isError && <Notice>{failureWords(deed.error)}</Notice>}
    <div className="mt-4 flex flex-wrap gap-3">
      <Button className="font-semibold text-madder" disabled={deed.isPending} onClick={onDelete}>
        Delete for good
      </Button>
      <Button onClick={onClose}>Keep it</Button>
    </div>
  </Dialog>
);
