import { z } from 'zod';
import { endpoint } from './endpoint.ts';
import { givenName } from './kept-text.ts';
import { draftRequest } from './requests.ts';
import { done } from './saving.ts';

/** Hours a class may be open for, the shortest first. */
export const classHours = [2, 8, 24, 72, 168, 720] as const;

/** What only the link knows: 256 random bits. The server keeps a digest of it. */
const token = z.string().regex(/^[\w-]{43}$/);

/** A step by its id, such as `front/bust-line`. */
const step = z.string().regex(/^[a-z0-9-]{1,60}\/[a-z0-9-]{1,60}$/);

const unit = z.enum(['cm', 'in']);

const doneReply = { kind: 'json', schema: done } as const;

/** A class as its tutor sees it; its link is told once, when it is opened. */
const listed = z.object({
  id: z.uuid(),
  gownId: z.uuid(),
  title: z.string(),
  step: z.string(),
  openedAt: z.iso.datetime(),
  expiresAt: z.iso.datetime(),
});
export type ListedClass = z.output<typeof listed>;

/** Opens a gown's replay, as it is drawn at this moment, to whoever has the link. */
export const openClass = endpoint({
  method: 'POST',
  path: '/api/gowns/:gownId/classes',
  params: z.object({ gownId: z.uuid() }),
  body: z.strictObject({
    title: givenName.describe('What the class sees as its name.'),
    step,
    unit,
    hours: z.union(classHours.map((hours) => z.literal(hours))),
  }),
  reply: {
    kind: 'json',
    schema: z.object({ id: z.uuid(), token, expiresAt: z.iso.datetime() }),
  },
});

/** Classes of the account that are open now, last opened first. */
export const listClasses = endpoint({
  method: 'GET',
  path: '/api/classes',
  body: undefined,
  reply: { kind: 'json', schema: z.object({ classes: z.array(listed) }) },
});

const own = z.object({ classId: z.uuid() });

/** The tutor turns to a step, and those who follow turn with her. */
export const turnClass = endpoint({
  method: 'POST',
  path: '/api/classes/:classId/step',
  params: own,
  body: z.strictObject({ step }),
  reply: doneReply,
});

/** Ends a class at once: its link leads nowhere from now on. */
export const withdrawClass = endpoint({
  method: 'POST',
  path: '/api/classes/:classId/withdraw',
  params: own,
  body: undefined,
  reply: doneReply,
});

const visitor = z.object({ token });

/** What a class sees: inputs without a name or a day, and where the tutor stands. */
export const visitClass = endpoint({
  method: 'GET',
  path: '/api/class-visits/:token',
  params: visitor,
  body: undefined,
  reply: {
    kind: 'json',
    schema: z.object({
      title: z.string(),
      unit,
      step: z.string(),
      inputs: draftRequest,
      expiresAt: z.iso.datetime(),
    }),
  },
});

/** Where the tutor stands, asked for every few seconds by all who follow. */
export const followClass = endpoint({
  method: 'GET',
  path: '/api/class-visits/:token/step',
  params: visitor,
  body: undefined,
  reply: { kind: 'json', schema: z.object({ step: z.string() }) },
});
