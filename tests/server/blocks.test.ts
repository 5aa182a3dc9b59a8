import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { draftGarment } from '#shared/api/drafts.ts';
import { card, post } from './support/request-bodies.ts';
import { type ServerUnderTest, startServer } from './support/server-under-test.ts';

let server: ServerUnderTest;
beforeAll(async () => {
  server = await startServer();
});
afterAll(() => server.close());

const drafts = (body: object) => post(`${server.address}/api/drafts`, body);
const problemsOf = async (reply: Response): Promise<string> => JSON.stringify(await reply.json());

describe('a block is refused in the words of its own style card', () => {
  it('a garment there is not, with those there are', async () => {
    const reply = await drafts({ garment: 'cape', card });
    expect(reply.status).toBe(422);
    expect(await problemsOf(reply)).toContain('“gown”, “bodice-block”, “skirt-block”');
  });

  it('a choice of another garment', async () => {
    const reply = await drafts({ garment: 'skirt-block', card, style: { topDrop: 180 } });
    expect(reply.status).toBe(422);
    expect(await problemsOf(reply)).toContain('There is no field “style.topDrop”');
  });

  it('a figure out of its bounds, by name', async () => {
    const reply = await drafts({ garment: 'bodice-block', card, style: { ease: { bust: 900 } } });
    expect(reply.status).toBe(422);
    expect(await problemsOf(reply)).toContain('style.ease.bust');
  });
});

describe.each([
  ['bodice-block', 'bodice-front', { bustDart: 'topLine' }],
  ['skirt-block', 'skirt-front', { length: 640 }],
] as const)('a %s over HTTP', (garment, piece, style) => {
  it('is drafted and proven, and its inputs draft it again', async () => {
    const reply = await drafts({ garment, card, style });
    expect(reply.status).toBe(200);
    const draft = draftGarment.reply.schema.parse(await reply.json());
    expect(draft.garment).toBe(garment);
    expect(draft.proof.holds).toBe(true);
    const again = draftGarment.reply.schema.parse(await (await drafts(draft.inputs)).json());
    expect(again).toEqual(draft);
  });

  it('is printed whole, under its own name, whichever pieces of a gown are asked for', async () => {
    const body = { garment, card, style, unit: 'cm', paper: 'A4', pieces: 'bodice-toile' };
    const svg = await post(`${server.address}/api/prints/pieces.svg`, body);
    expect(svg.status).toBe(200);
    expect(await svg.text()).toContain(`data-piece="${piece}"`);
    for (const what of ['tiles', 'chalk-sheet']) {
      const pdf = await post(`${server.address}/api/prints/${what}`, body);
      expect(pdf.status, what).toBe(200);
      expect((await pdf.arrayBuffer()).byteLength).toBeGreaterThan(5000);
      const name = pdf.headers.get('content-disposition');
      expect(name).toContain(what === 'tiles' ? garment : 'chalk-sheet');
    }
  });
});
