import type { Dispatch } from 'react';

import { styleLabels } from '#shared/drafts/gown/style-labels.ts';

import type { TableAction } from '../table-state.ts';

const circles = [
  { value: 0.25, label: 'quarter circle' },
  { value: 0.5, label: 'half circle' },
  { value: 0.75, label: 'three quarters' },
  { value: 1, label: 'full circle' },
] as const;

type FlareFractionProps = {
  readonly text: string | undefined;
  readonly dispatch: Dispatch<TableAction>;
};

/** How much of a full circle the flare is. */
export const FlareFraction = ({ text = '0.5', dispatch }: FlareFractionProps) => (
  <label className="flex items-center justify-between gap-3 border-b border-rule py-1">
    <span>{styleLabels.flareFraction}</span>
    <select
      name="style.flareFraction"
      className="h-9 rounded-one border border-rule bg-paper px-2"
      value={text}
      onChange={(event) =>
        dispatch({ type: 'typed', field: 'style.flareFraction', text: event.currentTarget.value })
      }
    >
      {circles.map(({ value, label }) => (
        <option key={value} value={String(value)}>
          {label}
        </option>
      ))}
    </select>
  </label>
);
