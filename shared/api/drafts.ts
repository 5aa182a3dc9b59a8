import { endpoint } from './endpoint.ts';
import { draftedSchema } from './draft-reply.ts';
import { draftRequest, printRequest, sheetsRequest } from './requests.ts';

/** A gown or a block drafted and proven, as JSON. */
export const draftGarment = endpoint({
  method: 'POST',
  path: '/api/drafts',
  body: draftRequest,
  reply: { kind: 'json', schema: draftedSchema },
});

/** True-scale pages to glue together. */
export const printTiles = endpoint({
  method: 'POST',
  path: '/api/prints/tiles',
  body: printRequest,
  reply: { kind: 'file', mediaType: 'application/pdf' },
});

/** One page at quarter scale to draft from with tape and chalk. */
export const printChalkSheet = endpoint({
  method: 'POST',
  path: '/api/prints/chalk-sheet',
  body: printRequest,
  reply: { kind: 'file', mediaType: 'application/pdf' },
});

/** The pieces as SVG, one user unit to the millimetre. */
export const printPieces = endpoint({
  method: 'POST',
  path: '/api/prints/pieces.svg',
  body: printRequest,
  reply: { kind: 'file', mediaType: 'image/svg+xml' },
});

/** The sheets of an order on any paper: the cover first, then the sheets its plan names. */
export const printSheets = endpoint({
  method: 'POST',
  path: '/api/prints/sheets',
  body: sheetsRequest,
  reply: { kind: 'file', mediaType: 'application/pdf' },
});

/** The pieces of an order as SVG, one user unit to the millimetre, each once and as drafted. */
export const printSheetsSvg = endpoint({
  method: 'POST',
  path: '/api/prints/sheets.svg',
  body: sheetsRequest,
  reply: { kind: 'file', mediaType: 'image/svg+xml' },
});
