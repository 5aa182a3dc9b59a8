import { useEffect, useRef } from 'react';

import type { Step } from '#shared/drafting/step.ts';
import { contents } from '#shared/lesson/contents.ts';

type StepListProps = {
  readonly steps: readonly Step[];
  readonly place: number;
  readonly onChoose: (place: number) => void;
};

/** Every step by the part it belongs to; the one that is shown is marked and kept in sight. */
export const StepList = ({ steps, place, onChoose }: StepListProps) => {
  const list = useRef<HTMLDivElement>(null);
  useEffect(() => {
    list.current?.querySelector('[aria-current]')?.scrollIntoView({ block: 'nearest' });
  }, [place]);
  return (
    <nav ref={list} aria-label="Steps" className="space-y-4">
      {contents(steps).map((chapter) => (
        <div key={chapter.from}>
          <h2 className="heading">{chapter.part}</h2>
          <ol>
            {chapter.steps.map((step, index) => {
              const at = chapter.from + index;
              return (
                <li key={step.id}>
                  <button
                    type="button"
                    aria-current={at === place ? 'step' : undefined}
                    className="flex min-h-9 w-full items-center gap-2 border-l-2 border-transparent px-2 text-left pointer-coarse:min-h-11 aria-[current=step]:border-brass aria-[current=step]:bg-paper aria-[current=step]:font-semibold hover:bg-paper"
                    onClick={() => onChoose(at)}
                  >
                    <span className="figures w-6 shrink-0 text-right text-sm text-slate">
                      {at + 1}
                    </span>
                    {step.title}
                  </button>
                </li>
              );
            })}
          </ol>
        </div>
      ))}
    </nav>
  );
};
