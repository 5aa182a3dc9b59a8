import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { draftGarment } from '#shared/api/drafts.ts';
import { listSamples } from '#shared/api/samples.ts';
import { checkCard } from '#shared/body/check-card.ts';
import { card, post, print } from './support/request-bodies.ts';
import { type ServerUnderTest, startServer } from './support/server-under-test.ts';

let server: ServerUnderTest;
beforeAll(async () => {
  server = await startServer();
});
afterAll(() => server.close());

const readDraft = async (reply: Response) => {
  expect(reply.status).toBe(200);
  return draftGarment.reply.schema.parse(await reply.json());
};

describe('a card becomes a draft', () => {
  it('with its pieces, steps and proof, and no chance in it', async () => {
    const first = await readDraft(await post(`${server.address}/api/drafts`, { card }));
    const second = await readDraft(await post(`${server.address}/api/drafts`, { card }));
    expect(first.pieces.length).toBeGreaterThanOrEqual(8);
    expect(first.steps.length).toBeGreaterThan(10);
    expect(first.proof.holds).toBe(true);
    expect(second).toEqual(first);
  });

  it('by the preset and the differences a workroom gives', async () => {
    const rules = { preset: 'quarterRule', allowance: { hem: 12 } };
    const draft = await readDraft(await post(`${server.address}/api/drafts`, { card, rules }));
    expect(draft.inputs.rules.balance.bust).toBe(0);
    expect(draft.inputs.rules.allowance).toMatchObject({ hem: 12, seam: 15 });
  });
});

describe('the samples of the house', () => {
  it('are four, and every one of them can be drawn and proves', async () => {
    const reply = await fetch(`${server.address}/api/samples`);
    const { samples } = listSamples.reply.schema.parse(await reply.json());
    expect(samples.map((each) => each.id)).toEqual(['tamsin', 'judith', 'bridget', 'lotte']);
    for (const { card: measures, style, rules } of samples) {
      expect(checkCard(measures)).toEqual([]);
      const body = { card: measures, style, rules };
      const draft = await readDraft(await post(`${server.address}/api/drafts`, body));
      expect(draft.proof.holds, measures.name).toBe(true);
    }
  });
});

describe('prints come as files named after the card', () => {
  it.each([
    ['tiles', 'application/pdf', '%PDF-', 'judith-amsel-bodice-toile-a4.pdf'],
    ['chalk-sheet', 'application/pdf', '%PDF-', 'judith-amsel-chalk-sheet-a4.pdf'],
    ['pieces.svg', 'image/svg+xml', '<?xml', 'judith-amsel-bodice-toile.svg'],
  ])('%s', async (what, mediaType, start, name) => {
    const reply = await post(`${server.address}/api/prints/${what}`, print);
    expect(reply.status).toBe(200);
    expect(reply.headers.get('content-type')?.split(';')[0]).toBe(mediaType);
    expect(reply.headers.get('content-disposition')).toBe(
      `attachment; filename="${name}"; filename*=UTF-8''${name}`,
    );
    const bytes = new Uint8Array(await reply.arrayBuffer());
    expect(new TextDecoder('latin1').decode(bytes.slice(0, 5))).toBe(start);
  });

  it('the bodice toile is fewer bytes than the whole gown, and the SVG has only its pieces', async () => {
    const size = async (pieces: string) => {
      const reply = await post(`${server.address}/api/prints/tiles`, { ...print, pieces });
      return (await reply.arrayBuffer()).byteLength;
    };
    expect(await size('bodice-toile')).toBeLessThan(await size('whole-gown'));
    const svg = await (await post(`${server.address}/api/prints/pieces.svg`, print)).text();
    expect(svg).toContain('data-piece="front-top');
    expect(svg).not.toContain('data-piece="front-middle"');
  });
});

describe('a name is only ever text', () => {
  const sly = '<script>alert("1")</script>\r\nSet-Cookie: a=b';

  it('in a file name and a header', async () => {
    const reply = await post(`${server.address}/api/prints/tiles`, {
      ...print,
      card: { ...card, name: sly },
    });
    expect(reply.status).toBe(200);
    expect(reply.headers.get('set-cookie')).toBeNull();
    expect(reply.headers.get('content-disposition')).toMatch(
      /^attachment; filename="[a-z0-9-]+\.pdf"; filename\*=UTF-8''[a-z0-9-]+\.pdf$/,
    );
  });

  it('in the SVG', async () => {
    const reply = await post(`${server.address}/api/prints/pieces.svg`, {
      ...print,
      card: { ...card, name: sly },
    });
    const svg = await reply.text();
    expect(reply.status).toBe(200);
    expect(svg).not.toContain('<script');
  });
});
