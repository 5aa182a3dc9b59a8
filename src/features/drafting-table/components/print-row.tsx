import { Button } from '../../../ui/button.tsx';
import { RodProgress } from '../../../ui/rod-progress.tsx';
import type { PrintOrder } from '../queries.ts';
import { refusalWords, usePrint } from '../use-print.ts';

type PrintRowProps = {
  readonly title: string;
  readonly note: string;
  readonly sheets: number;
  readonly order: PrintOrder;
};

/** One thing to print: its sheets beside the button, then its progress, its file or why there is none. */
export const PrintRow = ({ title, note, sheets, order }: PrintRowProps) => {
  const print = usePrint();
  return (
    <section aria-label={title} className="border-b border-rule py-3">
      <div className="flex flex-wrap items-center justify-between gap-x-4 gap-y-1 sm:flex-nowrap">
        <p className="basis-full text-sm text-slate sm:basis-auto">{note}</p>
        <p className="figures ml-auto flex shrink-0 items-center gap-3">
          <span>{sheets === 1 ? '1 sheet' : `${sheets} sheets`}</span>
          <Button
            kind="primary"
            className="w-32 px-2"
            disabled={print.waiting}
            onClick={() => print.order(order)}
          >
            {title}
          </Button>
        </p>
      </div>
      <div role="status">
        {print.waiting && (
          <p className="mt-2 flex items-center gap-3 text-sm">
            <RodProgress label={`Writing: ${title}`} />
            Writing…
            <Button kind="quiet" className="min-h-8 px-2" onClick={print.cancel}>
              Cancel
            </Button>
          </p>
        )}
        {print.saved !== undefined && (
          <p className="mt-2 text-sm text-verdigris">
            {`✓ saved as ${print.saved.name} `}
            <a
              className="text-brass underline"
              href={print.saved.address}
              target="_blank"
              rel="noreferrer"
            >
              Open
            </a>
          </p>
        )}
        {print.refused !== null && (
          <p className="mt-2 text-sm text-madder">{refusalWords(print.refused, order.unit)}</p>
        )}
      </div>
    </section>
  );
};
