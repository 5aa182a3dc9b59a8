import { useMemo, useState } from 'react';

import { type Alignment, atCentreWaist } from '#shared/compare/alignment.ts';
import { compareDrafts, sharedEdges } from '#shared/compare/compare-drafts.ts';
import type { Drafted } from '#shared/engine/drafted.ts';
import { compareSvg } from '#shared/exports/compare-svg.ts';
import { pieceTitles } from '#shared/exports/figure-words.ts';
import type { Unit } from '#shared/units/said.ts';

import { fetchComparison } from '../queries.ts';
import { FigureTable } from './figure-table.tsx';
import { OverlayDrawing } from './overlay-drawing.tsx';
import { OverlayTools, type OverlayView } from './overlay-tools.tsx';
import { TakeAway } from './take-away.tsx';

type OverlayBenchProps = {
  readonly first: Drafted;
  readonly second: Drafted;
  readonly names: { readonly first: string; readonly second: string };
  readonly unit: Unit;
  readonly onAlign?: (align: Alignment) => void;
  /** Whether the figures of both stand below: not where they are told otherwise. */
  readonly figures?: boolean;
};

/** Two drafts over each other with all that belongs to them: tools, drawing, files, figures. */
export const OverlayBench = (props: OverlayBenchProps) => {
  const { first, second, names, unit, onAlign, figures = true } = props;
  const [view, setView] = useState<OverlayView>({ align: atCentreWaist, share: 0 });
  const { align } = view;
  const comparison = useMemo(() => compareDrafts(first, second, align), [first, second, align]);
  const seams = useMemo(() => sharedEdges(first, second), [first, second]);
  const titles = useMemo(() => pieceTitles(first, second), [first, second]);
  const stacks = useMemo(
    () =>
      comparison.pairs.map((pair) => ({
        name: pair.name,
        pieces: [pair.first, pair.second].flatMap((each) => each ?? []),
      })),
    [comparison],
  );
  const shown = comparison.pairs.some(({ name }) => name === view.only) ? view.only : undefined;
  return (
    <div className="space-y-4">
      <OverlayTools
        view={{ ...view, only: shown }}
        onView={(next) => {
          setView(next);
          if (next.align !== align) onAlign?.(next.align);
        }}
        comparison={comparison}
        seams={seams}
        names={names}
      />
      <figure className="rounded-one border border-rule bg-paper p-2">
        <OverlayDrawing
          comparison={comparison}
          names={names}
          unit={unit}
          share={view.share}
          only={shown}
        />
        <figcaption className="px-2 text-sm text-slate">
          {`Solid: ${names.first}. Dashed: ${names.second}. Seam lines; strokes falling to the right fill what only the first has, rising ones what only the second has.`}
          {view.share > 0 && ' The heavy line is on its way from one to the other.'}
        </figcaption>
      </figure>
      <TakeAway
        stacks={stacks}
        svg={() => ({
          text: compareSvg(comparison, names, unit),
          name: 'compared.svg',
        })}
        pdf={(on) =>
          fetchComparison({
            first: first.inputs,
            second: second.inputs,
            names: { first: names.first.slice(0, 60), second: names.second.slice(0, 60) },
            align,
            unit,
            ...on,
          })
        }
      />
      {figures && <FigureTable rows={comparison.rows} titles={titles} names={names} unit={unit} />}
    </div>
  );
};
