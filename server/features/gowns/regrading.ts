import type { Received } from '#shared/api/endpoint.ts';
import type {
  GownContent,
  noteCard as noting,
  regradeGown as regrading,
} from '#shared/api/gowns.ts';
import { measureCard } from '#shared/api/card.ts';
import { engineVersion } from '#shared/engine/draft-gown.ts';
import { dayInWords } from '#shared/exports/day.ts';
import { error } from '#shared/units/problem.ts';
import { said } from '#shared/units/said.ts';
import { holdAccount } from '../../database/account-hold.ts';
import type { Drawing } from '../../drafting/drawing.ts';
import { notFound } from '../../http/conflict.ts';
import { mostKept, refuseOneTooMany } from '../../http/most-kept.ts';
import { RefusalError, refusalFor } from '../../http/refusal.ts';
import { lastingTurn } from '../../http/turn-of.ts';
import { contentOf } from './gown-view.ts';
import { keepForGood } from './keep-as-revision.ts';
import { findGown, type GownRow, holdGown, type LaidCard, setGownCard } from './repository.ts';
import { countNamedRevisions } from './revision-repository.ts';
import type { Maker, Workroom } from './saved-or-conflict.ts';
import { changeGown, laidCard, lookAhead, readGown, type Saved } from './service.ts';

/** A gown is one person's: her measures never stand in the past of somebody else's. */
function refuseAnother(row: GownRow, card: LaidCard): void {
  if (row.personId === null || row.personId === card.personId) return;
  throw new RefusalError(
    'another-person',
    'This gown is made for somebody else than this card is. Keep it as a new gown instead; this one stays as it is.',
  );
}

/** Notes that a card was laid on a gown. */
export async function noteCard(
  { database }: Workroom,
  { accountId }: Maker,
  gownId: string,
  { cardId }: Received<typeof noting>,
): Promise<Record<string, never>> {
  return database.transaction(async (turn) => {
    await holdAccount(turn, accountId);
    const row = await holdGown(turn, accountId, gownId);
    if (row === undefined) throw notFound('gown');
    const card = await laidCard(turn, accountId, cardId);
    refuseAnother(row, card);
    await setGownCard(turn, accountId, gownId, card);
    return {};
  });
}

type DepthsGiven = Received<typeof regrading>['depths'];

/** What is kept, on another card; only a gown has depths of a top edge. */
function inputsOn(row: GownRow, card: LaidCard, depths: DepthsGiven): GownContent['inputs'] {
  const { inputs } = contentOf(row);
  if (inputs.garment !== undefined && inputs.garment !== 'gown')
    return { ...inputs, card: card.card };
  return { ...inputs, card: card.card, style: { ...inputs.style, ...depths } };
}

/** The content on another card: figures are written anew where card or depths change them. */
function contentOn(row: GownRow, card: LaidCard, depths: DepthsGiven): GownContent {
  const kept = Object.entries(row.typed.fields).filter(
    ([field]) => !field.startsWith('card.') && !(field.replace(/^style\./, '') in depths),
  );
  return {
    typed: { unit: row.typed.unit, fields: Object.fromEntries(kept) },
    unread: [],
    inputs: inputsOn(row, card, depths),
  };
}

/** Draws the regraded gown, or says why it cannot be. */
async function drawnOrRefused(
  { drafter }: Workroom,
  { accountId }: Maker,
  content: GownContent,
): Promise<Drawing> {
  const whole = measureCard.safeParse(content.inputs.card);
  if (!whole.success) {
    const field = `card.${String(whole.error.issues[0]?.path[0] ?? '')}`;
    throw refusalFor(
      'bad-input',
      [
        error({
          code: 'missing',
          field,
          said: said`The measure card is not filled in yet: take the measures a gown needs, then regrade.`,
        }),
      ],
      content.typed.unit,
    );
  }
  const turn = lastingTurn(accountId);
  const drawing = await drafter.drawing(content, turn);
  if (drawing !== undefined) return drawing;
  await drafter.reply({ ...content.inputs, card: whole.data }, turn);
  throw new Error('A gown that gave no drawing gave a draft.');
}

const dayOf = ({ takenOn }: LaidCard): string => dayInWords(takenOn);

/** The card was saved while the gown was drawn on it. */
class CardChangedError extends Error {
  constructor() {
    super('The card was saved while the gown was drawn on it.');
    this.name = 'CardChangedError';
  }
}

/** A gown is drawn again so often for a card that is saved meanwhile. */
const mostDrawings = 3;

/** Redraws a gown for another card; what stood there and what comes of it are both kept for good. */
export async function regradeGown(
  workroom: Workroom,
  maker: Maker,
  gownId: string,
  order: Received<typeof regrading>,
): Promise<Saved> {
  for (let drawing = 1; drawing <= mostDrawings; drawing += 1) {
    try {
      return await regradeOnce(workroom, maker, gownId, order);
    } catch (error) {
      if (!(error instanceof CardChangedError)) throw error;
    }
  }
  throw new RefusalError(
    'conflict',
    'The measure card was saved again and again while the gown was drawn on it. The gown is as it was: regrade it once more.',
    { current: await readGown(workroom, maker, gownId) },
  );
}

/** The same from one reading of the card, which must still stand when the gown is saved. */
async function regradeOnce(
  workroom: Workroom,
  maker: Maker,
  gownId: string,
  { engine, cardId, depths, ...save }: Received<typeof regrading>,
): Promise<Saved> {
  const { database } = workroom;
  const before = await lookAhead(workroom, maker, gownId, { engine, ...save });
  if (before !== undefined) return before;
  if (engine !== engineVersion) {
    throw new RefusalError(
      'engine-changed',
      'A gown is regraded by today’s rules only. Open it again and redraw it first.',
    );
  }
  const row = await findGown(database, maker.accountId, gownId);
  if (row === undefined) throw notFound('gown');
  const card = await laidCard(database, maker.accountId, cardId);
  refuseAnother(row, card);
  const content = contentOn(row, card, depths);
  const drawing = await drawnOrRefused(workroom, maker, content);
  return changeGown(workroom, maker, gownId, save, async (turn, held) => {
    const laid = await laidCard(turn, maker.accountId, cardId);
    refuseAnother(held, laid);
    if (laid.version !== card.version) throw new CardChangedError();
    refuseOneTooMany(
      'named revisions of one gown',
      (await countNamedRevisions(turn, gownId)) + 1,
      mostKept.namedRevisions,
    );
    const parent = await keepForGood(turn, held, `Before the card of ${dayOf(laid)}`);
    return {
      content,
      drawing,
      parentId: parent.id,
      cardId,
      personId: laid.personId,
      keepAs: `For the card of ${dayOf(laid)}`,
    };
  });
}
