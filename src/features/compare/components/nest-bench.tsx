import { useMemo, useState } from 'react';

import { type Alignment, atCentreWaist } from '#shared/compare/alignment.ts';
import type { Drafted } from '#shared/engine/drafted.ts';
import { pieceTitles } from '#shared/exports/figure-words.ts';
import { nestStacks } from '#shared/exports/nest-stacks.ts';
import { nestSvg } from '#shared/exports/nest-svg.ts';
import { nestReport } from '#shared/regrade/nest-report.ts';
import { type Nest, type NestOrder, sizeLabel } from '#shared/regrade/nest.ts';
import type { Unit } from '#shared/units/said.ts';

import { Segmented } from '../../../ui/segmented.tsx';
import { fetchNest } from '../queries.ts';
import { NestDrawing, SizeSample } from './nest-drawing.tsx';
import { NestReportView } from './nest-report-view.tsx';
import { AlignTools, PieceChoice } from './overlay-tools.tsx';
import { TakeAway } from './take-away.tsx';

type NestBenchProps = {
  readonly base: Drafted;
  readonly nest: Nest;
  readonly order: NestOrder;
  readonly unit: Unit;
};

/** A nest: its sizes over each other, its files, its report. */
export const NestBench = ({ base, nest, order, unit }: NestBenchProps) => {
  const [align, setAlign] = useState<Alignment>(atCentreWaist);
  const [lines, setLines] = useState<'finished' | 'cutting'>('finished');
  const [only, setOnly] = useState<string>();
  const [hidden, setHidden] = useState<ReadonlySet<number>>(new Set());
  const stacks = useMemo(() => nestStacks(nest, align), [nest, align]);
  const report = useMemo(() => nestReport(nest, align), [nest, align]);
  const steps = nest.sizes.map(({ step }) => step);
  const seams = [...new Set(base.pieces.flatMap(({ edges }) => edges.map(({ name }) => name)))];
  const piece = stacks.some(({ name }) => name === only) ? only : undefined;
  const shownStacks = useMemo(
    () => stacks.filter(({ name }) => piece === undefined || name === piece),
    [stacks, piece],
  );
  const turn = (step: number) =>
    setHidden(
      (now) => new Set(now.has(step) ? [...now].filter((each) => each !== step) : [...now, step]),
    );
  return (
    <div className="space-y-4">
      <div className="flex flex-wrap items-end gap-x-6 gap-y-3">
        <AlignTools align={align} onAlign={setAlign} seams={seams} />
        <PieceChoice pieces={stacks} only={piece} onOnly={setOnly} />
        <Segmented
          legend="Lines"
          choices={[
            { value: 'finished', label: 'seam lines' },
            { value: 'cutting', label: 'cutting lines' },
          ]}
          value={lines}
          onChoose={setLines}
        />
      </div>
      <fieldset className="flex flex-wrap gap-x-4 gap-y-1">
        <legend className="text-sm text-slate">Sizes shown</legend>
        {steps.map((step) => (
          <label key={step} className="flex items-center gap-1">
            <input
              type="checkbox"
              className="accent-brass"
              checked={!hidden.has(step)}
              onChange={() => turn(step)}
            />
            {sizeLabel(step)}
            <SizeSample step={step} steps={steps} />
          </label>
        ))}
      </fieldset>
      <figure className="rounded-one border border-rule bg-paper p-2">
        <NestDrawing
          stacks={shownStacks}
          steps={steps}
          shown={new Set(steps.filter((step) => !hidden.has(step)))}
          cut={lines === 'cutting'}
        />
        <figcaption className="px-2 text-sm text-slate">
          The card’s own size is solid; every other size has a dash of its own and its label on the
          line.
        </figcaption>
      </figure>
      <TakeAway
        stacks={stacks}
        svg={() => ({ text: nestSvg(nest, { align, lines }, unit), name: 'nest.svg' })}
        pdf={(on) => fetchNest({ inputs: base.inputs, nest: order, lines, align, unit, ...on })}
      />
      <NestReportView
        nest={nest}
        report={report}
        titles={pieceTitles(...nest.sizes.map(({ draft }) => draft))}
        unit={unit}
      />
    </div>
  );
};
