import type { Request, Response } from 'express';
import { ipKeyGenerator } from 'express-rate-limit';
import type { Turn } from './first-come-queue.ts';

/** One household's addresses count as one where a network gives each machine its own (IPv6). */
export const addressOf = (request: Request): string => ipKeyGenerator(request.ip ?? '');

/** A place in a line for whoever sent a request; given up when the connection closes unanswered. */
export function turnOf(request: Request, response: Response): Turn {
  const leaving = new AbortController();
  response.once('close', () => {
    if (!response.writableFinished) leaving.abort();
  });
  if (request.socket.destroyed) leaving.abort();
  return { from: addressOf(request), gone: leaving.signal };
}

/** A place in a line that is kept though the connection closes: what a maker saves is saved. */
export const lastingTurn = (from: string): Turn => ({ from, gone: new AbortController().signal });
