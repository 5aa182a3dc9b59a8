import { useState } from 'react';
import { useSearchParams } from 'react-router-dom';

import { type Garment, garments } from '#shared/engine/drafted.ts';

import { failureWords } from '../../../lib/failure-words.ts';
import { readersUnit } from '../../../lib/reader.ts';
import { Notice } from '../../../ui/notice.tsx';
import { Select } from '../../../ui/select.tsx';
import { UnitChoice } from '../../../ui/unit-choice.tsx';
import { OverlayBench } from '../components/overlay-bench.tsx';
import { Labelled } from '../components/overlay-tools.tsx';
import { ProblemList } from '../components/problem-list.tsx';
import { asGarment, otherwiseFor } from '../otherwise.ts';
import { type Found, useChoices, useRevisions, useSource } from '../sources.ts';
import { useDraft } from '../use-draft.ts';

const garmentTitles: { readonly [G in Garment]: string } = {
  gown: 'Gown',
  'bodice-block': 'Bodice block',
  'skirt-block': 'Skirt block',
};

const same = 'same:';

/** What a failed source says. */
const FailedSource = ({ found, which }: { found: Found; which: string }) =>
  found.state === 'failed' ? (
    <Notice>
      {found.error === null
        ? `The ${which} has not been drawn yet. Choose another one, or draw it on the drafting table first.`
        : failureWords(found.error)}
    </Notice>
  ) : null;

/** Any two drafts over each other. */
export const ComparePage = () => {
  const [address, setAddress] = useSearchParams();
  const [unit, setUnit] = useState(readersUnit);
  const choices = useChoices();
  const firstKey = address.get('first') ?? choices[0]?.value;
  const secondKey = address.get('second') ?? `${same}no-ease`;
  const first = useSource(firstKey);
  const own = first.state === 'found' ? first.inputs.garment : undefined;
  const garment = garments.find((each) => each === address.get('garment')) ?? own ?? 'gown';
  const alone = secondKey.startsWith(same);
  const other = useSource(alone ? firstKey : secondKey);
  const revisions = useRevisions(firstKey);
  const ways = otherwiseFor({ garment });
  const way = ways.find(({ key }) => secondKey === `${same}${key}`) ?? ways[0];

  const firstInputs = first.state === 'found' ? asGarment(first.inputs, garment) : undefined;
  const otherInputs = other.state === 'found' ? asGarment(other.inputs, garment) : undefined;
  const firstDraft = useDraft(firstInputs);
  const secondDraft = useDraft(alone && otherInputs && way ? way.change(otherInputs) : otherInputs);
  const put = (key: string, value: string) =>
    setAddress(
      (now) => {
        const next = new URLSearchParams(now);
        next.set(key, value);
        if (key === 'garment' && alone) next.set('second', `${same}no-ease`);
        return next;
      },
      { replace: true },
    );
  const names = {
    first: first.state === 'found' ? first.title : '',
    second: alone ? (way?.label ?? '').toLowerCase() : other.state === 'found' ? other.title : '',
  };
  return (
    <main id="content" className="mx-auto w-full max-w-[86rem] grow space-y-4 px-4 py-8 sm:px-8">
      <title>Ellwand · compare</title>
      <div className="flex flex-wrap items-end justify-between gap-4">
        <div>
          <h1 className="text-3xl font-semibold">Compare</h1>
          <p className="mt-2 max-w-prose">
            Two drafts lie over each other; choose what they are laid together on, and slide from
            one to the other.
          </p>
        </div>
        <UnitChoice unit={unit} onUnit={setUnit} />
      </div>
      <div className="flex flex-wrap items-end gap-x-6 gap-y-3">
        <Labelled label="First draft">
          {(id) => (
            <Select
              id={id}
              name="first"
              choices={choices}
              value={firstKey ?? ''}
              onChoose={(key) => put('first', key)}
            />
          )}
        </Labelled>
        <Labelled label="Garment">
          {(id) => (
            <Select
              id={id}
              name="garment"
              choices={garments.map((value) => ({ value, label: garmentTitles[value] }))}
              value={garment}
              onChoose={(value) => put('garment', value)}
            />
          )}
        </Labelled>
        <Labelled label="Second draft">
          {(id) => (
            <Select
              id={id}
              name="second"
              choices={[
                ...ways.map(({ key, label }) => ({
                  value: `${same}${key}`,
                  label: `The same: ${label.charAt(0).toLowerCase()}${label.slice(1)}`,
                })),
                ...revisions,
                ...choices.filter(({ value }) => value !== firstKey),
              ]}
              value={secondKey}
              onChoose={(key) => put('second', key)}
            />
          )}
        </Labelled>
      </div>
      <FailedSource found={first} which="first draft" />
      {!alone && <FailedSource found={other} which="second draft" />}
      {firstDraft && 'problems' in firstDraft && (
        <ProblemList title="The first cannot be drawn" problems={firstDraft.problems} unit={unit} />
      )}
      {secondDraft && 'problems' in secondDraft && (
        <ProblemList
          title="The second cannot be drawn"
          problems={secondDraft.problems}
          unit={unit}
        />
      )}
      {(first.state === 'pending' || other.state === 'pending') && (
        <p role="status" className="text-slate">
          Fetching…
        </p>
      )}
      {firstDraft && 'draft' in firstDraft && secondDraft && 'draft' in secondDraft && (
        <OverlayBench
          first={firstDraft.draft}
          second={secondDraft.draft}
          names={names}
          unit={unit}
        />
      )}
    </main>
  );
};
