import { expect, it } from 'vitest';
import { draftSchema } from '#shared/api/draft-reply.ts';
import { balanced } from '#shared/drafting/house-rule-presets.ts';
import { draftGown } from '#shared/engine/draft-gown.ts';
import { middleBody } from '../support/middle-body.ts';

it.each(['princess', 'darts'] as const)(
  'a gown with %s goes over the wire whole: the contract strips nothing of it',
  (shaping) => {
    const draft = draftGown({ card: middleBody, style: { shaping }, rules: balanced });
    const sent: unknown = JSON.parse(JSON.stringify(draft));
    expect(draftSchema.parse(sent)).toEqual(sent);
  },
);
