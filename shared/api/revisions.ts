import { z } from 'zod';
import { endpoint } from './endpoint.ts';
import { drawnPieces, gownContent } from './gowns.ts';
import { givenName } from './kept-text.ts';
import { baseVersion, saved, saveId } from './saving.ts';

const summary = {
  id: z.uuid(),
  /** As the maker named it, or why it was kept. */
  name: z.string(),
  /** Kept by itself before something replaced it, rather than named by the maker. */
  automatic: z.boolean(),
  /** Version of the gown it is a copy of. */
  version: z.int(),
  /** The revision the gown came from by then: last returned to, or regraded from. */
  parentId: z.uuid().nullable(),
  /** The measure card that had been laid on it last. */
  cardId: z.uuid().nullable(),
  createdAt: z.iso.datetime(),
  drawnBy: z.string().nullable(),
};
const revision = z.object(summary);

const gownId = z.uuid();
const params = z.object({ gownId, revisionId: z.uuid() });

/** Revisions of a gown, newest first. */
export const listRevisions = endpoint({
  method: 'GET',
  path: '/api/gowns/:gownId/revisions',
  params: z.object({ gownId }),
  body: undefined,
  reply: { kind: 'json', schema: z.object({ revisions: z.array(revision) }) },
});

/** Names the gown as it was last saved; refused as a `conflict` where that is another version. */
export const nameRevision = endpoint({
  method: 'POST',
  path: '/api/gowns/:gownId/revisions',
  params: z.object({ gownId }),
  body: z.strictObject({ saveId, baseVersion, name: givenName }),
  reply: { kind: 'json', schema: revision },
});

export const readRevision = endpoint({
  method: 'GET',
  path: '/api/gowns/:gownId/revisions/:revisionId',
  params,
  body: undefined,
  reply: {
    kind: 'json',
    schema: z.object({ ...summary, content: gownContent, drawn: drawnPieces.nullable() }),
  },
});

/**
 * Makes a revision the gown again, as a new version with the pieces as they were drawn then; what
 * stood there before is kept as a revision of its own.
 */
export const returnToRevision = endpoint({
  method: 'POST',
  path: '/api/gowns/:gownId/revisions/:revisionId/return',
  params,
  body: z.strictObject({ saveId, baseVersion }),
  reply: { kind: 'json', schema: saved },
});
