import type { Unit } from '#shared/units/said.ts';

import { Segmented } from '../../../ui/segmented.tsx';

/** Centimetres or inches. */
export const UnitChoice = ({ unit, onUnit }: { unit: Unit; onUnit: (unit: Unit) => void }) => (
  <Segmented
    legend="Unit"
    choices={[
      { value: 'in', label: 'inch' },
      { value: 'cm', label: 'cm' },
    ]}
    value={unit}
    onChoose={onUnit}
  />
);
