import type { ReactNode } from 'react';

/** Something that went wrong, said once where it happened. */
export const Notice = ({ children }: { children: ReactNode }) => (
  <div role="alert" className="rounded-one border border-madder bg-paper px-3 py-2 text-madder">
    {children}
  </div>
);
