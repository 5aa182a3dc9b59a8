import { execFile } from 'node:child_process';
import { mkdir, mkdtemp, readFile, readdir, rm, symlink, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { PDFDocument } from 'pdf-lib';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { draftSchema } from '#shared/api/draft-reply.ts';
import { refusal } from '#shared/api/problem-codes.ts';
import { prove } from '#shared/proof/prove.ts';
import { point } from '#shared/geometry/point.ts';
import { endOf } from '#server/ops/command-order.ts';
import { moveSeamPoint, withPiece } from '../support/tamper.ts';
import { card, post } from './support/request-bodies.ts';
import { type ServerUnderTest, startServer } from './support/server-under-test.ts';

let folder: string;
let server: ServerUnderTest;
beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'draft-'));
  server = await startServer();
});
afterAll(async () => {
  await server.close();
  await rm(folder, { recursive: true, force: true });
});

type Ended = { readonly code: number; readonly said: string; readonly told: string };

function ended(program: string, args: readonly string[]): Promise<Ended> {
  return new Promise((resolve) => {
    const child = execFile(program, args, (_error, said, told) => {
      resolve({ code: child.exitCode ?? -1, said, told });
    });
  });
}

/** The command as npm runs it, without the second npm takes. */
const draft = (...args: string[]) =>
  ended(process.execPath, ['--import', 'tsx', 'server/ops/draft.ts', ...args]);

async function file(name: string, content: unknown): Promise<string> {
  const path = join(folder, name);
  await writeFile(path, typeof content === 'string' ? content : JSON.stringify(content));
  return path;
}

const order = async (measures: unknown, style: unknown = {}) => [
  ...['--measures', await file('card.json', measures)],
  ...['--style', await file('style.json', style)],
  ...['--out', join(folder, 'out')],
];

describe('bad input ends with 2, and stderr names the field', () => {
  it('nothing at all, asked for as the README says', async () => {
    const { code, told } = await ended('npm', ['run', '--silent', 'draft']);
    expect(code).toBe(2);
    expect(told).toContain('--measures is missing');
  });

  it('a file that is not there, or is no JSON', async () => {
    const absent = await draft('--measures', '/no/card.json', '--style', 's', '--out', folder);
    expect(absent).toMatchObject({ code: 2, said: '' });
    expect(absent.told).toContain('--measures: the file /no/card.json cannot be read');
    const args = await order('{"bustGirth": 9');
    expect((await draft(...args)).told).toMatch(/^--measures: the file .*card\.json is not JSON/);
  });

  it('an option or a paper nobody knows', async () => {
    expect(await draft('--colour', 'red')).toMatchObject({ code: 2 });
    const { code, told } = await draft(...(await order(card)), '--paper', 'A9');
    expect(code).toBe(2);
    expect(told).toContain('--paper must be one of A4, A3, Letter');
    const thin = await draft(...(await order(card)), '--paper', '5x30cm');
    expect(thin).toMatchObject({ code: 2, said: '' });
    expect(thin.told).toContain('--paper: The width 5.0 cm must lie between');
  });

  it.each([
    ['a measure out of range', { ...card, bustGirth: 92 }, {}],
    ['a missing measure', { ...card, hipGirth: undefined }, {}],
    ['an unknown field', card, { sleeves: 2 }],
    ['two measures that do not go together', { ...card, underbustGirth: 1000, bustGirth: 800 }, {}],
    ['a style out of range', card, { kneeFinished: 200 }],
  ])('%s, in the words the server uses', async (_case, measures, style) => {
    const { code, told } = await draft(...(await order(measures, style)));
    expect(code).toBe(2);
    const reply = await post(`${server.address}/api/drafts`, { card: measures, style });
    const { message, problems = [] } = refusal.parse(await reply.json());
    expect(problems.length).toBeGreaterThan(0);
    const lines = told.trim().split('\n');
    expect(lines.map((line) => line.slice(0, line.indexOf(': ')))).toEqual(
      problems.map((each) => each.field),
    );
    expect(lines.map((line) => line.slice(line.indexOf(': ') + 2)).join(' ')).toBe(message);
  });

  it('in inches for whoever asks for inches', async () => {
    const { told } = await draft(...(await order({ ...card, bustGirth: 92 })), '--unit', 'in');
    expect(told).toMatch(/between .* in and .* in/);
  });

  it('a folder that cannot be made', async () => {
    const blocked = await file('blocked', '');
    const args = await order(card);
    for (const out of [join(blocked, 'out'), blocked, '/proc/ellwand', '/proc/ellwand/out']) {
      const { code, told } = await draft(...args.slice(0, -1), out);
      expect(code).toBe(2);
      expect(told).toBe(`--out: the folder ${out} cannot be written to.\n`);
    }
  });
});

describe('what a terminal would obey is shown and not sent to it', () => {
  it('in a path, an option or the name of a field', async () => {
    const sly = '\u001b[2J\u0007\u009b\nall is well\u202e';
    const told = [
      await draft('--measures', sly, '--style', 's', '--out', folder),
      await draft(`--${sly}`, 'red'),
      await draft(...(await order({ ...card, [sly]: 1 }))),
    ].map((each) => each.told);
    for (const each of told) {
      expect(each).toContain('all is well');
      expect(each.replaceAll('\n', '')).not.toMatch(/[\p{Cc}\p{Bidi_Control}]/u);
      expect(each.split('\n').some((line) => line.startsWith('all is well'))).toBe(false);
    }
  });
});

describe('what lies in the folder already', () => {
  it('is replaced by its name; a link is not followed, and nothing half written is left', async () => {
    const out = join(folder, 'linked');
    await mkdir(out);
    const elsewhere = await file('elsewhere.txt', 'her notes');
    await symlink(elsewhere, join(out, 'pieces.svg'));
    await writeFile(join(out, 'draft.json'), 'an older draft');
    const args = await order(card);
    expect((await draft(...args.slice(0, -1), out)).code).toBe(0);
    expect(await readFile(elsewhere, 'utf8')).toBe('her notes');
    expect(await readFile(join(out, 'pieces.svg'), 'utf8')).toContain('<svg');
    expect(await readdir(out)).toHaveLength(4);
  });

  it('is left alone where a folder has the name of a file', async () => {
    const out = join(folder, 'taken');
    await mkdir(join(out, 'pieces.svg'), { recursive: true });
    const args = await order(card);
    expect((await draft(...args.slice(0, -1), out)).code).toBe(2);
    expect(await readdir(out)).toEqual(['pieces.svg']);
  });
});

describe('a gown whose every proof line holds ends with 0', () => {
  it('and leaves the four files of the contract', async () => {
    const { code, said } = await draft(...(await order(card)), '--paper', 'Letter');
    expect(code).toBe(0);
    expect(said.trim()).not.toBe('');
    const out = join(folder, 'out');
    expect((await readdir(out)).sort()).toEqual([
      'draft.json',
      'pieces.svg',
      'proof.json',
      'tiles.pdf',
    ]);
    const drawn = draftSchema.parse(JSON.parse(await readFile(join(out, 'draft.json'), 'utf8')));
    expect(JSON.parse(await readFile(join(out, 'proof.json'), 'utf8'))).toEqual(drawn.proof);
    expect((await readFile(join(out, 'tiles.pdf'))).subarray(0, 5).toString()).toBe('%PDF-');
  });
});

describe('a worksheet', () => {
  it('is written beside the others when it is asked for', async () => {
    expect((await draft(...(await order(card)), '--worksheet')).code).toBe(0);
    const bytes = await readFile(join(folder, 'out', 'worksheet.pdf'));
    expect(bytes.subarray(0, 5).toString()).toBe('%PDF-');
  });
});

describe('every paper is printed by its name, and a sheet of one’s own by its sides', () => {
  it.each([
    ['A0', 841, 1189],
    ['Tabloid', 279.4, 431.8],
    ['12x18in', 304.8, 457.2],
  ])('%s', async (paper, width, height) => {
    expect((await draft(...(await order(card)), '--paper', paper)).code).toBe(0);
    const pdf = await PDFDocument.load(await readFile(join(folder, 'out', 'tiles.pdf')));
    const page = pdf.getPage(0);
    expect((page.getWidth() / 72) * 25.4).toBeCloseTo(width, 2);
    expect((page.getHeight() / 72) * 25.4).toBeCloseTo(height, 2);
  });
});

describe('a gown that is drawn with a failed line', () => {
  it('ends with 1, however many other lines hold', async () => {
    const args = await order(card);
    await draft(...args);
    const drawn = draftSchema.parse(
      JSON.parse(await readFile(join(folder, 'out', 'draft.json'), 'utf8')),
    );
    const slipped = withPiece(drawn.pieces, drawn.pieces[0]?.name ?? '', (piece) =>
      moveSeamPoint(piece, piece.edges[0]?.path[0]?.from ?? point(0, 0), point(0, 5)),
    );
    const { construction, inputs } = drawn;
    expect(endOf(drawn.proof)).toBe(0);
    expect(endOf(prove({ pieces: slipped, construction, rules: inputs.rules }))).toBe(1);
  });
});

describe('the schema of each file can be asked for', () => {
  it.each([
    ['card', 'bustGirth'],
    ['style', 'topDrop'],
    ['rules', 'sideShare'],
  ])('%s has %s', async (name, key) => {
    const { code, said } = await draft('--schema', name);
    expect(code).toBe(0);
    expect(JSON.parse(said)).toHaveProperty(['properties', key]);
  });

  it('and another is refused', async () => {
    expect(await draft('--schema', 'gown')).toMatchObject({ code: 2, said: '' });
  });
});
