import type { z } from 'zod';

/** What comes back: JSON of a schema, or a file to keep. */
type JsonReply<R extends z.ZodType> = { readonly kind: 'json'; readonly schema: R };
type FileReply = { readonly kind: 'file'; readonly mediaType: 'application/pdf' | 'image/svg+xml' };
export type Reply = JsonReply<z.ZodType> | FileReply;

/** What fills the places of a path. */
type PathParams = z.ZodType<Readonly<Record<string, string>>>;

/** One line of the contract, read alike by the server and by the browser. */
export type Endpoint<
  B extends z.ZodType | undefined = z.ZodType | undefined,
  R extends Reply = Reply,
  P extends PathParams | undefined = PathParams | undefined,
> = {
  readonly method: 'GET' | 'POST';
  /** What stands for a parameter is written `:gownId`. */
  readonly path: `/api/${string}`;
  /** Shape of the path's parameters, absent where it has none; a value that does not fit is not found. */
  readonly params?: P;
  /** Shape of the JSON body, absent for a GET. */
  readonly body: B;
  readonly reply: R;
};

/** Writes a line of the contract down, with its types kept. */
export const endpoint = <
  B extends z.ZodType | undefined,
  const R extends Reply,
  P extends PathParams | undefined = undefined,
>(
  contract: Endpoint<B, R, P>,
): Endpoint<B, R, P> => contract;

/** Parameters in the path of a line of the contract; `undefined` where it has none. */
export type Params<E extends Endpoint> = [NonNullable<E['params']>] extends [never]
  ? undefined
  : z.output<NonNullable<E['params']>>;

/** The address of a line of the contract, its parameters filled in. */
export const addressOf = (
  { path }: Endpoint,
  params: Readonly<Record<string, string>> = {},
): string => path.replace(/:(\w+)/g, (_, name: string) => encodeURIComponent(params[name] ?? ''));

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
