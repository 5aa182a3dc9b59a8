import { cleanup, fireEvent, render, screen } from '@testing-library/react';
import { useReducer } from 'react';
import { afterEach, expect, test } from 'vitest';

import { MeasureCard } from '../../../../../src/features/drafting-table/components/measure-card.tsx';
import { emptyTable, tableState } from '../../../../../src/features/drafting-table/table-state.ts';

const Card = () => {
  const [state, dispatch] = useReducer(tableState, emptyTable);
  return <MeasureCard state={state} dispatch={dispatch} />;
};

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
