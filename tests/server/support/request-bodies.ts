import { sampleCards } from '#shared/body/sample-cards.ts';

/** A card and choices as a browser sends them. */
export const card = sampleCards.judith;

export const print = { card, unit: 'cm', paper: 'A4', pieces: 'bodice-toile' };

export const post = (url: string, body: unknown, headers: Record<string, string> = {}) =>
  fetch(url, {
    method: 'POST',
    headers: { 'content-type': 'application/json', ...headers },
    body: typeof body === 'string' ? body : JSON.stringify(body),
  });
