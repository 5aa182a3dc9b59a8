import { useQuery } from '@tanstack/react-query';

import { measureCard } from '#shared/api/card.ts';
import type { GownContent } from '#shared/api/gowns.ts';
import type { DraftedInputs } from '#shared/engine/drafted.ts';

import { signedInHint } from '../../lib/signed-in-hint.ts';
import { gownQuery, gownsQuery, revisionQuery, revisionsQuery, samplesQuery } from './queries.ts';

/** Where a draft may come from, as the page's address has it: `sample:…`, `gown:…`, `revision:gown:…`. */
export type SourceKey = string;

/** What was found under a key. */
export type Found =
  | { readonly state: 'pending' }
  | { readonly state: 'failed'; readonly error: Error | null }
  | { readonly state: 'found'; readonly title: string; readonly inputs: DraftedInputs };

type Choice = { readonly value: SourceKey; readonly label: string };

/** What a gown was drawn from: the last good pieces, or what stands in it where that can be drawn. */
function inputsOf(
  drawn: { readonly inputs: DraftedInputs } | null,
  content: GownContent,
): DraftedInputs | undefined {
  if (drawn !== null) return drawn.inputs;
  const card = measureCard.safeParse(content.inputs.card);
  return card.success ? { ...content.inputs, card: card.data } : undefined;
}

/** The draft under a key. */
export function useSource(key: SourceKey | undefined): Found {
  const [kind = '', id = '', revisionId = ''] = (key ?? '').split(':');
  const samples = useQuery({ ...samplesQuery, enabled: kind === 'sample' });
  const gown = useQuery({ ...gownQuery(id), enabled: kind === 'gown' });
  const revision = useQuery({ ...revisionQuery(id, revisionId), enabled: kind === 'revision' });
  if (kind === 'sample') {
    const sample = samples.data?.find((each) => each.id === id);
    if (sample !== undefined) {
      const { card, style, rules, title } = sample;
      return { state: 'found', title, inputs: { card, style, rules } };
    }
    return samples.isPending ? { state: 'pending' } : { state: 'failed', error: samples.error };
  }
  const asked = kind === 'gown' ? gown : revision;
  if (kind === 'gown' ? gown.data !== undefined : revision.data !== undefined) {
    const found = kind === 'gown' ? gown.data : revision.data;
    const inputs = found && inputsOf(found.drawn, found.content);
    const title = kind === 'gown' ? gown.data?.title : revision.data?.name;
    return inputs === undefined
      ? { state: 'failed', error: null }
      : { state: 'found', title: title ?? '', inputs };
  }
  if (kind !== 'gown' && kind !== 'revision') return { state: 'failed', error: null };
  return asked.isPending ? { state: 'pending' } : { state: 'failed', error: asked.error };
}

/** What there is to choose from: samples for everybody, and one's own gowns. */
export function useChoices(): readonly Choice[] {
  const samples = useQuery(samplesQuery);
  const gowns = useQuery({ ...gownsQuery, enabled: signedInHint() });
  return [
    ...(gowns.data ?? [])
      .filter(({ archived, drawnBy }) => !archived && drawnBy !== null)
      .map(({ id, title }) => ({ value: `gown:${id}`, label: title })),
    ...(samples.data ?? []).map(({ id, title }) => ({
      value: `sample:${id}`,
      label: `Sample: ${title}`,
    })),
  ];
}

/** Revisions of the gown under a key, newest first; none of a sample. */
export function useRevisions(key: SourceKey | undefined): readonly Choice[] {
  const [kind, id = ''] = (key ?? '').split(':');
  const revisions = useQuery({ ...revisionsQuery(id), enabled: kind === 'gown' });
  return (revisions.data ?? [])
    .filter(({ drawnBy }) => drawnBy !== null)
    .map((each) => ({ value: `revision:${id}:${each.id}`, label: `Revision: ${each.name}` }));
}
