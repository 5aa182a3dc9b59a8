import { describe, expect, it } from 'vitest';
import { draftJson, proofJson } from '#shared/exports/json.ts';
import { paperDraft } from '../support/paper-draft.ts';
import { oblong } from '../support/paper-pieces.ts';

const draft = paperDraft([oblong('front-top', 100.12345, 200)]);

describe('the exported JSON', () => {
  it('holds inputs, levels, pieces, steps and proof', () => {
    const read: unknown = JSON.parse(draftJson(draft));
    expect(read).toMatchObject({
      number: '4F2A',
      inputs: { card: { bustGirth: 920 } },
      levels: { waist: 433 },
      pieces: [{ name: 'front-top' }],
      steps: [],
      proof: { holds: true },
    });
  });

  it('writes lengths to a thousandth of a millimetre', () => {
    expect(draftJson(draft)).toContain('"x": 100.123');
    expect(draftJson(draft)).not.toMatch(/\d\.\d{4}/);
  });

  it('gives the proof alone too', () => {
    expect(JSON.parse(proofJson(draft))).toEqual({ ...draft.proof });
  });
});
