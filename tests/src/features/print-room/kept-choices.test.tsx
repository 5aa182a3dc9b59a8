import { beforeEach, expect, test } from 'vitest';

import { keepChoices, keptChoices } from '../../../../src/features/print-room/kept-choices.ts';
import { plainChoices, roomChoices } from '../../../../src/features/print-room/room-choices.ts';
import { rememberUnit } from '../../../../src/lib/reader.ts';

const at = { maker: 'A', place: '/try' };
const chosen = [
  { type: 'chosen', choice: { paper: 'A3', inkSaving: true, scale: 0.25 } },
  { type: 'typed', field: 'margin', text: '12.7 mm' },
  { type: 'typed', field: 'overlap', text: 'a thumb' },
  { type: 'sheet', plan: 'one', name: 'B2' },
  { type: 'unit', unit: 'in' },
] as const;
const room = chosen.reduce(roomChoices, plainChoices('cm', 'A4'));

// The browser of these tests is an American one.
beforeEach(() => {
  localStorage.clear();
  sessionStorage.clear();
});

test('nothing is lost when the page is opened again', () => {
  keepChoices(at, room);
  expect(keptChoices(at, 'cm')).toEqual(room);
});

test('paper, unit and margins are those of the maker, for every gown; a teaching scale is not', () => {
  keepChoices(at, room);
  const next = keptChoices({ ...at, place: '/gowns/2' }, 'cm');
  expect(next).toMatchObject({ unit: 'in', paper: 'A3', inkSaving: true, scale: 1 });
  expect(next.lengths.margin.read).toEqual({ mm: 12.7 });
  expect(next.leftOut.names).toEqual([]);
});

test('another maker on this browser begins anew', () => {
  keepChoices(at, room);
  const other = keptChoices({ maker: 'B', place: '/gowns/2' }, 'cm');
  expect(other).toMatchObject({ unit: 'cm', paper: 'Letter' });
});

test('what somebody else wrote into the browser is not trusted', () => {
  localStorage.setItem('ellwand.print-room.A', '{"version":1,"paper":"A9"}');
  sessionStorage.setItem('ellwand.print-room.draft./try', 'nonsense');
  expect(keptChoices(at, 'cm')).toEqual(plainChoices('cm', 'Letter'));
});

test('a unit chosen at another place since is the unit of the print room', () => {
  keepChoices(at, room);
  rememberUnit('cm');
  const next = keptChoices(at, 'in');
  expect(next.unit).toBe('cm');
  expect(next.lengths.margin).toEqual({ text: '1.3', read: { mm: 12.7 } });
});
