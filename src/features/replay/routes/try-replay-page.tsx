import { QueryClientProvider } from '@tanstack/react-query';

import type { Drafted } from '#shared/engine/drafted.ts';
import type { Unit } from '#shared/units/said.ts';

import { queryClient } from '../../../lib/query-client.ts';
import { useUnit } from '../../../lib/use-unit.ts';
import { ReplayedDraft } from '../components/replayed-draft.tsx';
import { NothingDrawn } from '../components/nothing-drawn.tsx';
import { useSteps } from '../use-steps.ts';
import { Worksheet } from '../components/worksheet.tsx';

type TryReplayPageProps = {
  readonly draft: Drafted | undefined;
  readonly unit: Unit;
};

const table = { to: '/try', label: 'Drafting table' };

/** The replay of what lies on the table at Try it. */
export const TryReplayPage = ({ draft, unit }: TryReplayPageProps) =>
  draft === undefined ? (
    <NothingDrawn to={table.to} label="To the drafting table" />
  ) : (
    <QueryClientProvider client={queryClient}>
      <title>Ellwand · replay</title>
      <Told draft={draft} unit={unit} />
    </QueryClientProvider>
  );

const Told = ({ draft, unit: first }: { readonly draft: Drafted; readonly unit: Unit }) => {
  const [unit, setUnit] = useUnit(first);
  const steps = useSteps(draft.steps);
  return (
    <ReplayedDraft
      draft={draft}
      steps={steps}
      unit={unit}
      onUnit={setUnit}
      title={draft.inputs.card.name ?? 'A gown to try'}
      back={table}
      tools={<Worksheet inputs={draft.inputs} unit={unit} />}
    />
  );
};
