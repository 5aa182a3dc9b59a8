import type { Gown } from '#shared/api/gowns.ts';
import { draftAny, type Drafted } from '#shared/engine/drafted.ts';
import { DraftingError } from '#shared/drafting/drafting-error.ts';
import { speak } from '#shared/units/speak.ts';

import { Button } from '../../../ui/button.tsx';
import { FullSheet } from '../../../ui/full-sheet.tsx';
import { choicesOf } from '../gown-content.ts';
import { SideBySide } from './side-by-side.tsx';

type RedrawingSheetProps = {
  readonly gown: Gown & { readonly drawn: NonNullable<Gown['drawn']> };
  readonly onRedraw: () => void;
  readonly onLeave: () => void;
};

/** A gown drawn by older rules: what today's would make of it, before anything changes. */
export const RedrawingSheet = ({ gown, onRedraw, onLeave }: RedrawingSheetProps) => {
  const { drawn, redrawing } = gown;
  const { choices, unit } = choicesOf(gown.content);
  const problems = redrawing?.problems ?? [];
  return (
    <FullSheet
      title="Drawn by older rules"
      help={`Ellwand ${drawn.engine} drew “${gown.title}”; today’s rules would draw it otherwise, and nothing changes until you say so.`}
      actions={
        <>
          <Button kind="primary" onClick={onRedraw}>
            {problems.length === 0 ? 'Redraw by today’s rules' : 'Open it and mend the figures'}
          </Button>
          <Button onClick={onLeave}>Leave it as it was drawn</Button>
          <p className="text-sm text-slate sm:basis-full">
            When it is redrawn the pieces of today are kept as a revision.
          </p>
        </>
      }
    >
      {problems.map((problem) => (
        <p key={`${problem.field} ${problem.code}`} className="figures mb-3 text-madder">
          {speak(problem.said, unit)}
        </p>
      ))}
      <SideBySide
        unit={unit}
        left={{
          title: 'As it was drawn',
          note: `by Ellwand ${drawn.engine}`,
          work: choices,
          pieces: drawn.pieces,
        }}
        right={{
          title: 'By today’s rules',
          note: `by Ellwand ${redrawing?.engine ?? ''}`,
          work: choices,
          pieces: drawnToday(drawn.inputs)?.pieces,
        }}
      />
    </FullSheet>
  );
};

function drawnToday(inputs: NonNullable<Gown['drawn']>['inputs']): Drafted | undefined {
  try {
    return draftAny(inputs);
  } catch (error) {
    if (error instanceof DraftingError) return undefined;
    throw error;
  }
}
