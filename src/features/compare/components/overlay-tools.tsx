import { type ReactNode, useId } from 'react';

import { type Alignment, alignPoints, alignTitles } from '#shared/compare/alignment.ts';
import type { Comparison } from '#shared/compare/compare-drafts.ts';

import { Select } from '../../../ui/select.tsx';

/** What the reader has chosen to see. */
export type OverlayView = {
  readonly align: Alignment;
  readonly only?: string | undefined;
  readonly share: number;
};

type OverlayToolsProps = {
  readonly view: OverlayView;
  readonly onView: (view: OverlayView) => void;
  readonly comparison: Comparison;
  /** Names of edges both drafts have. */
  readonly seams: readonly string[];
  readonly names: { readonly first: string; readonly second: string };
};

/** A label and its control in a row of tools. */
export const Labelled = ({
  label,
  children,
}: {
  label: string;
  children: (id: string) => ReactNode;
}) => {
  const id = useId();
  return (
    <div className="flex min-w-0 flex-col">
      <label htmlFor={id} className="text-sm text-slate">
        {label}
      </label>
      {children(id)}
    </div>
  );
};

const alignChoices = (seams: readonly string[]) => [
  ...alignPoints.map((point) => ({ value: `point:${point}`, label: alignTitles[point] })),
  ...seams.map((edge) => ({ value: `seam:${edge}`, label: `Seam: ${edge.replaceAll('-', ' ')}` })),
];

const keyOf = (align: Alignment): string =>
  align.on === 'point' ? `point:${align.point}` : `seam:${align.edge}`;

function alignmentOf(key: string): Alignment {
  const point = alignPoints.find((each) => key === `point:${each}`);
  return point === undefined
    ? { on: 'seam', edge: key.replace(/^seam:/, '') }
    : { on: 'point', point };
}

/** What the drafts are laid together on, and which piece is shown. */
export const AlignTools = ({
  align,
  onAlign,
  seams,
}: {
  align: Alignment;
  onAlign: (align: Alignment) => void;
  seams: readonly string[];
}) => (
  <Labelled label="Laid together on">
    {(id) => (
      <Select
        id={id}
        name="align"
        choices={alignChoices(seams)}
        value={keyOf(align)}
        onChoose={(key) => onAlign(alignmentOf(key))}
      />
    )}
  </Labelled>
);

/** Which piece is shown, or all of them. */
export const PieceChoice = ({
  pieces,
  only,
  onOnly,
}: {
  pieces: readonly { readonly name: string; readonly title: string }[];
  only: string | undefined;
  onOnly: (only: string | undefined) => void;
}) => (
  <Labelled label="Piece">
    {(id) => (
      <Select
        id={id}
        name="piece"
        choices={[
          { value: '', label: 'All pieces' },
          ...pieces.map(({ name, title }) => ({ value: name, label: title })),
        ]}
        value={only ?? ''}
        onChoose={(name) => onOnly(name === '' ? undefined : name)}
      />
    )}
  </Labelled>
);

/** Alignment, piece, and the slider from one draft to the other. */
export const OverlayTools = (props: OverlayToolsProps) => {
  const { view, onView, comparison, seams, names } = props;
  return (
    <div className="flex flex-wrap items-end gap-x-6 gap-y-3">
      <AlignTools
        align={view.align}
        seams={seams}
        onAlign={(align) => onView({ ...view, align })}
      />
      <PieceChoice
        pieces={comparison.pairs}
        only={view.only}
        onOnly={(only) => onView({ ...view, only })}
      />
      <Labelled label={`From ${names.first} to ${names.second}`}>
        {(id) => (
          <input
            id={id}
            type="range"
            min={0}
            max={100}
            value={Math.round(view.share * 100)}
            aria-valuetext={`${Math.round(view.share * 100)} per cent of the way`}
            className="h-9 w-56 max-w-full accent-brass"
            onChange={(event) =>
              onView({ ...view, share: Number(event.currentTarget.value) / 100 })
            }
          />
        )}
      </Labelled>
    </div>
  );
};
