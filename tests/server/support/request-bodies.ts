/** A card and choices as a browser sends them; the body is invented. */
export const card = {
  name: 'Judith Amsel',
  date: '2026-10-12',
  bustGirth: 920,
  underbustGirth: 780,
  waistGirth: 738,
  hipGirth: 990,
  bustSpan: 190,
  sideNeckToBustPoint: 275,
  sideNeckToUnderbust: 345,
  frontWaistLength: 440,
  waistToHip: 205,
  waistToFloor: 1050,
};

export const print = { card, unit: 'cm', paper: 'A4', pieces: 'bodice-toile' };

export const post = (url: string, body: unknown, headers: Record<string, string> = {}) =>
  fetch(url, {
    method: 'POST',
    headers: { 'content-type': 'application/json', ...headers },
    body: typeof body === 'string' ? body : JSON.stringify(body),
  });
