import type { z } from 'zod';

/** What comes back: JSON of a schema, or a file to keep. */
type JsonReply<R extends z.ZodType> = { readonly kind: 'json'; readonly schema: R };
type FileReply = { readonly kind: 'file'; readonly mediaType: 'application/pdf' | 'image/svg+xml' };
export type Reply = JsonReply<z.ZodType> | FileReply;

/** One line of the contract, read alike by the server and by the browser. */
export type Endpoint<
  B extends z.ZodType | undefined = z.ZodType | undefined,
  R extends Reply = Reply,
> = {
  readonly method: 'GET' | 'POST';
  readonly path: `/api/${string}`;
  /** Shape of the JSON body, absent for a GET. */
  readonly body: B;
  readonly reply: R;
};

/** Writes a line of the contract down, with its types kept. */
export const endpoint = <B extends z.ZodType | undefined, const R extends Reply>(
  contract: Endpoint<B, R>,
): Endpoint<B, R> => contract;

/** What a caller sends, and what the server has read (defaults filled in). */
export type Sent<E extends Endpoint> = E['body'] extends z.ZodType ? z.input<E['body']> : undefined;
export type Received<E extends Endpoint> = E['body'] extends z.ZodType
  ? z.output<E['body']>
  : undefined;

/** What a JSON endpoint answers; a file endpoint answers bytes. */
export type Answer<E extends Endpoint> =
  E['reply'] extends JsonReply<infer R>
    ? z.output<R>
    : E['reply'] extends FileReply
      ? Uint8Array
      : never;
