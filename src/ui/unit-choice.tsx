import type { Unit } from '#shared/units/said.ts';

import { rememberUnit } from '../lib/reader.ts';
import { Segmented } from './segmented.tsx';

/** Centimetres or inches; what is chosen in one place is remembered in all. */
export const UnitChoice = ({ unit, onUnit }: { unit: Unit; onUnit: (unit: Unit) => void }) => (
  <Segmented
    legend="Unit"
    choices={[
      { value: 'in', label: 'inch' },
      { value: 'cm', label: 'cm' },
    ]}
    value={unit}
    onChoose={(chosen) => {
      rememberUnit(chosen);
      onUnit(chosen);
    }}
  />
);
