import { expect, it } from 'vitest';
import { cardErrors, cardLoss } from './random-body.ts';

it('loses few of the bodies it draws, so that the laws look at nearly the whole of the limits', () => {
  expect(cardLoss(1000, 7), cardErrors(200, 7).join('\n')).toBeLessThan(0.05);
});
