import { useEffect, useId, useRef, type ReactNode } from 'react';

import { Button } from './button.tsx';

type DialogProps = {
  readonly title: string;
  readonly open: boolean;
  readonly onClose: () => void;
  readonly children: ReactNode;
};

/** A sheet laid over the page; Escape and Close take it away. */
export const Dialog = ({ title, open, onClose, children }: DialogProps) => {
  const dialog = useRef<HTMLDialogElement>(null);
  const id = useId();
  useEffect(() => {
    if (open) dialog.current?.showModal();
    else dialog.current?.close();
  }, [open]);
  return (
    <dialog
      ref={dialog}
      aria-labelledby={id}
      onClose={onClose}
      className="m-auto max-h-[92dvh] w-[min(36rem,calc(100vw-1.5rem))] overflow-y-auto rounded-one border border-rule bg-ground p-5 text-ink shadow-sheet backdrop:bg-black/40 sm:p-6"
    >
      {open && (
        <>
          <header className="flex items-center justify-between gap-3">
            <h2 id={id} className="text-xl font-semibold">
              {title}
            </h2>
            <Button kind="quiet" className="-mr-3 px-3" onClick={onClose}>
              Close
            </Button>
          </header>
          {children}
        </>
      )}
    </dialog>
  );
};
