import { useEffect, useId, useRef, type ReactNode } from 'react';

type FullSheetProps = {
  readonly title: string;
  readonly help: string;
  readonly actions: ReactNode;
  readonly children: ReactNode;
};

/** A sheet over everything that stays until one of its actions is chosen: Escape does not decide. */
export const FullSheet = ({ title, help, actions, children }: FullSheetProps) => {
  const dialog = useRef<HTMLDialogElement>(null);
  const id = useId();
  useEffect(() => {
    const shown = dialog.current;
    if (shown?.open === false) shown.showModal();
    return () => shown?.close();
  }, []);
  return (
    <dialog
      ref={dialog}
      aria-labelledby={`${id}-title`}
      aria-describedby={`${id}-help`}
      onCancel={(event) => event.preventDefault()}
      className="m-auto h-[min(60rem,calc(100dvh-1.5rem))] max-h-none w-[min(76rem,calc(100vw-1.5rem))] max-w-none rounded-one border border-rule bg-ground text-ink shadow-sheet backdrop:bg-black/40"
    >
      <div className="flex h-full flex-col">
        <header className="shrink-0 border-b border-rule px-4 py-3 sm:px-6">
          <h2 id={`${id}-title`} className="text-xl font-semibold">
            {title}
          </h2>
          <p id={`${id}-help`}>{help}</p>
        </header>
        <div
          tabIndex={0}
          className="min-h-0 grow overflow-y-auto px-4 py-4 -outline-offset-2 sm:px-6"
        >
          {children}
        </div>
        <footer className="flex shrink-0 flex-wrap items-center gap-3 border-t border-rule px-4 py-3 sm:px-6">
          {actions}
        </footer>
      </div>
    </dialog>
  );
};
