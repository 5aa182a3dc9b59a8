import type { Dispatch } from 'react';

import { bodiceBlockLengths } from '#shared/drafts/bodice-block/style-card.ts';
import { skirtLengthWords } from '#shared/drafts/skirt-block/style-card.ts';

import type { FieldKey } from '../fields.ts';
import { messageFor } from '../problem-words.ts';
import type { TableAction, TableState } from '../table-state.ts';
import { givenFor } from '../table-inputs.ts';
import { ChoiceField } from './choice-field.tsx';
import { DartTurning } from './dart-turning.tsx';
import { FigureField, fieldProps } from './figure-field.tsx';

type BlockStyleProps = {
  readonly state: TableState;
  readonly dispatch: Dispatch<TableAction>;
};

type Figure = readonly [FieldKey, { readonly label: string; readonly hint: string }];

const bodiceFigures: readonly Figure[] = [
  ['style.ease.bust', bodiceBlockLengths['ease.bust']],
  ['style.ease.waist', bodiceBlockLengths['ease.waist']],
  ['style.armholeDrop', bodiceBlockLengths.armholeDrop],
  ['style.shoulderEase', bodiceBlockLengths.shoulderEase],
];
const skirtFigures: readonly Figure[] = [
  ['style.ease.waist', skirtLengthWords['ease.waist']],
  ['style.ease.hip', skirtLengthWords['ease.hip']],
  ['style.seat', skirtLengthWords.seat],
  ['style.length', skirtLengthWords.length],
];

/** What a block shall be: only what this block has; a figure left open takes the default that stands there in grey. */
export const BlockStyle = ({ state, dispatch }: BlockStyleProps) => {
  const { draft, problems } = state.drawn;
  const own = draft?.garment === state.garment ? draft : undefined;
  const figures = (list: readonly Figure[]) =>
    list.map(([field, { label, hint }]) => (
      <FigureField
        key={field}
        {...fieldProps(field, state)}
        label={label}
        hint={hint}
        open={own && givenFor(field, own.inputs.card, own.style)}
        dispatch={dispatch}
      />
    ));
  if (state.garment === 'skirt-block') return figures(skirtFigures);
  return (
    <>
      <ChoiceField
        choice="bustDart"
        value={state.bustDart}
        fault={messageFor('style.bustDart', problems, state)}
        dispatch={dispatch}
      />
      {own?.garment === 'bodice-block' && <DartTurning draft={own} />}
      <ChoiceField
        choice="bustDartRule"
        value={state.bustDartRule}
        fault={messageFor('style.bustDartRule', problems, state)}
        dispatch={dispatch}
      />
      {figures(bodiceFigures)}
    </>
  );
};
