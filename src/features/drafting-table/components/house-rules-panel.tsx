import { memo, useId, useState, type Dispatch } from 'react';

import { houseRuleFigures, type HouseRuleFigure } from '#shared/drafting/house-rule-figures.ts';
import { houseRulePresets, type HouseRulePreset } from '#shared/drafting/house-rule-presets.ts';

import { Segmented } from '../../../ui/segmented.tsx';
import { presetWords } from '../part-words.ts';
import { presetOf, rulesOf } from '../table-inputs.ts';
import type { TableAction, TableState } from '../table-state.ts';
import { FigureField, fieldProps } from './figure-field.tsx';
import { GivenIntakes } from './given-intakes.tsx';

type HouseRulesPanelProps = {
  readonly state: TableState;
  readonly dispatch: Dispatch<TableAction>;
};

const presets: readonly HouseRulePreset[] = ['balanced', 'quarterRule'];

const says: { readonly [P in HouseRulePreset | 'own']: string } = {
  balanced: 'The front has a little more than a quarter at the bust, less under it.',
  quarterRule: 'Front and back are alike at every level.',
  own: 'Your figures; they go with this gown wherever it is drawn.',
};

const groups: readonly { readonly title: string; readonly takes: (key: string) => boolean }[] = [
  { title: 'Front more than back', takes: (key) => key.startsWith('balance.') },
  { title: 'Side seam and darts', takes: (key) => !key.includes('.') },
  { title: 'Allowances', takes: (key) => key.startsWith('allowance.') },
];

/** How this workroom drafts: a preset, or figures of its own. They travel with the draft. */
export const HouseRulesPanel = memo(function HouseRulesPanel({
  state,
  dispatch,
}: HouseRulesPanelProps) {
  const heading = useId();
  const [opened, setOpened] = useState(false);
  const rules = rulesOf(state);
  const preset = presetOf(rules);
  const own = preset === undefined || opened;
  const row = ({ key, label, hint, value }: HouseRuleFigure) => (
    <FigureField
      key={key}
      {...fieldProps(`rules.${key}`, state)}
      label={label}
      hint={hint}
      open={value(state.rules)}
      dispatch={dispatch}
    />
  );
  return (
    <section aria-labelledby={heading} className="pt-6">
      <h2 id={heading} className="heading pb-2">
        House rules
      </h2>
      <Segmented
        legend="House rules"
        choices={[
          ...presets.map((each) => ({ value: each, label: presetWords[each] })),
          { value: 'own' as const, label: 'own' },
        ]}
        value={own ? 'own' : preset}
        onChoose={(chosen) => {
          setOpened(chosen === 'own');
          if (chosen !== 'own') dispatch({ type: 'ruled', rules: houseRulePresets[chosen] });
        }}
      />
      <p className="pt-1 text-sm leading-snug text-slate">{says[own ? 'own' : preset]}</p>
      {own &&
        groups.map(({ title, takes }) => (
          <div key={title} className="pt-3">
            <h3 className="font-semibold">{title}</h3>
            {houseRuleFigures.filter(({ key }) => takes(key)).map(row)}
          </div>
        ))}
      {own && <GivenIntakes state={state} dispatch={dispatch} />}
    </section>
  );
});
