import { cleanup, fireEvent, render, screen } from '@testing-library/react';
import { useReducer } from 'react';
import { afterEach, expect, test } from 'vitest';

import { MeasureCard } from '../../../../../src/features/drafting-table/components/measure-card.tsx';
import { bench } from '../../../../../src/features/drafting-table/bench.ts';
import { noHistory } from '../../../../../src/features/drafting-table/history.ts';
import { emptyTable } from '../../../../../src/features/drafting-table/table-state.ts';

const Card = () => {
  const [{ table }, dispatch] = useReducer(bench, { table: emptyTable, history: noHistory });
  return <MeasureCard state={table} dispatch={dispatch} onFilled={() => (filled += 1)} />;
};

let filled = 0;

const type = (label: string, text: string) => {
  const field = screen.getByLabelText<HTMLInputElement>(label);
  field.focus();
  fireEvent.change(field, { target: { value: text } });
  return field;
};

afterEach(cleanup);

test('Enter goes to the next measure, whose tape and way of taking it are shown', () => {
  render(<Card />);
  const bust = type('Bust', '92');
  fireEvent.keyDown(bust, { key: 'Enter' });
  expect(document.activeElement).toBe(screen.getByLabelText('Under-bust'));
  expect(screen.getByRole('img').getAttribute('aria-label')).toContain('Under-bust');
  expect(screen.getByText(/directly under the breasts/)).toBeDefined();
  expect(bust.value).toBe('92.0');
});

test('a message waits until the maker has finished typing, and then names both bounds', () => {
  render(<Card />);
  const hip = type('Hip', '9');
  expect(screen.queryByText(/must lie between/)).toBeNull();
  fireEvent.blur(hip);
  const message = screen.getByText(/Hip 9\.0 cm must lie between 75\.0 cm and 158\.0 cm/);
  expect(hip.getAttribute('aria-describedby')).toContain(message.id);
  expect(hip.value).toBe('9.0');
});

test('the ten measures stand first; the others only when they are asked for', () => {
  render(<Card />);
  expect(screen.queryByLabelText('Upper chest')).toBeNull();
  fireEvent.click(screen.getByRole('button', { name: /All measures \(31\)/ }));
  expect(screen.getByLabelText('Upper chest')).toBeDefined();
});

test('Enter goes from the name to the bust, and after the tenth measure the card is handed in', () => {
  render(<Card />);
  const name = screen.getByLabelText<HTMLInputElement>('Whose card');
  name.focus();
  fireEvent.keyDown(name, { key: 'Enter' });
  expect(document.activeElement).toBe(screen.getByLabelText('Bust'));
  filled = 0;
  fireEvent.keyDown(type('Waist to floor', '104'), { key: 'Enter' });
  expect(filled).toBe(1);
});

test('clearing says whose figures went, and brings them back', () => {
  Element.prototype.scrollIntoView = () => undefined;
  render(<Card />);
  fireEvent.change(screen.getByLabelText('Whose card'), { target: { value: 'Anna' } });
  fireEvent.blur(type('Bust', '92'));
  fireEvent.click(screen.getByRole('button', { name: 'Clear the table' }));
  expect(screen.getByText(/Anna’s figures are cleared/)).toBeDefined();
  fireEvent.click(screen.getByRole('button', { name: 'Bring them back' }));
  expect(screen.getByLabelText<HTMLInputElement>('Bust').value).toBe('92.0');
  expect(screen.queryByText(/figures are cleared/)).toBeNull();
});

test('the measures of an arm stand last, for sleeves', () => {
  render(<Card />);
  fireEvent.click(screen.getByRole('button', { name: /All measures/ }));
  const labels = screen.getAllByRole('textbox').map((field) => field.getAttribute('name'));
  expect(labels.slice(-4)).toEqual([
    'card.shoulderGirth',
    'card.upperArmGirth',
    'card.armLength',
    'card.wristGirth',
  ]);
});

test('an unlikely measure is kept with a reason, which can be taken back', () => {
  render(<Card />);
  for (const [label, text] of Object.entries(middle)) type(label, text);
  expect(screen.queryByText('Look again')).toBeNull();
  type('Waist', '98');
  expect(screen.getByText(/Waist 98\.0 cm is not smaller than bust/)).toBeDefined();
  fireEvent.click(screen.getAllByRole('button', { name: 'Keep it, with a reason' })[0] ?? document);
  const keep = screen.getByRole<HTMLButtonElement>('button', { name: 'Keep' });
  expect(keep.disabled).toBe(true);
  type('Why it is right', 'measured twice, eight months gone');
  fireEvent.click(keep);
  expect(screen.getByText(/✓ Kept: measured twice, eight months gone/)).toBeDefined();
  fireEvent.click(screen.getByRole('button', { name: 'Ask again' }));
  expect(screen.queryByText(/✓ Kept/)).toBeNull();
});

const middle = {
  Bust: '92',
  'Under-bust': '78',
  Waist: '73.8',
  Hip: '99',
  'Bust span': '19',
  'Side neck to bust point': '27.5',
  'Side neck to under-bust': '34.5',
  'Front waist length': '44',
  'Waist to hip': '20.5',
  'Waist to floor': '105',
};
