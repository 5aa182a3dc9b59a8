import { useId, useRef, type KeyboardEvent, type ReactNode } from 'react';

export type Tab<T extends string> = {
  readonly value: T;
  readonly label: string;
  readonly render: () => ReactNode;
};

type TabsProps<T extends string> = {
  readonly label: string;
  readonly tabs: readonly Tab<T>[];
  readonly value: T;
  readonly onChoose: (value: T) => void;
};

/** Sheets one behind the other, the chosen one in front; arrow keys walk the tabs. */
export function Tabs<T extends string>({ label, tabs, value, onChoose }: TabsProps<T>) {
  const id = useId();
  const list = useRef<HTMLDivElement>(null);
  const front = tabs.find((tab) => tab.value === value) ?? tabs[0];

  const walk = (event: KeyboardEvent) => {
    const by = { ArrowRight: 1, ArrowLeft: -1 }[event.key];
    if (by === undefined || front === undefined) return;
    event.preventDefault();
    const at = (tabs.indexOf(front) + by + tabs.length) % tabs.length;
    const next = tabs[at];
    if (next === undefined) return;
    onChoose(next.value);
    list.current?.querySelectorAll<HTMLElement>('[role=tab]')[at]?.focus();
  };

  if (front === undefined) return null;
  return (
    <div className="flex h-full min-h-0 flex-col">
      <div
        ref={list}
        role="tablist"
        aria-label={label}
        className="flex shrink-0 rounded-one border border-rule p-px"
      >
        {tabs.map((tab) => (
          <button
            key={tab.value}
            type="button"
            role="tab"
            id={`${id}-${tab.value}`}
            aria-selected={tab === front}
            aria-controls={`${id}-sheet`}
            tabIndex={tab === front ? 0 : -1}
            className="min-h-9 grow rounded-one px-1 pointer-coarse:min-h-11 text-slate aria-selected:bg-paper aria-selected:font-semibold aria-selected:text-ink"
            onClick={() => onChoose(tab.value)}
            onKeyDown={walk}
          >
            {tab.label}
          </button>
        ))}
      </div>
      <div
        key={front.value}
        role="tabpanel"
        id={`${id}-sheet`}
        aria-labelledby={`${id}-${front.value}`}
        className="-mx-2 min-h-0 grow overflow-y-auto overscroll-contain px-2 py-4 -outline-offset-2"
        tabIndex={0}
      >
        {front.render()}
      </div>
    </div>
  );
}
