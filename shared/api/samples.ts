import { z } from 'zod';
import { endpoint } from './endpoint.ts';
import { measureCard } from './card.ts';
import { houseRules } from './rules.ts';
import { styleCard } from './style.ts';

/** A gown to try Ellwand with, of a body invented by us. */
export const sampleGown = z.object({
  id: z.string(),
  title: z.string(),
  note: z.string(),
  card: measureCard,
  style: styleCard,
  rules: houseRules,
});

export const listSamples = endpoint({
  method: 'GET',
  path: '/api/samples',
  body: undefined,
  reply: { kind: 'json', schema: z.object({ samples: z.array(sampleGown) }) },
});
