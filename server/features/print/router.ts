import { Router } from 'express';
import { printChalkSheet, printPieces, printTiles } from '#shared/api/drafts.ts';
import type { PrintRequest } from '#shared/api/requests.ts';
import { addressLimit } from '../../http/address-limit.ts';
import { attachment, fileName } from '../../http/file-name.ts';
import { firstComeQueue } from '../../http/first-come-queue.ts';
import { serve } from '../../http/serve.ts';
import type { Limits } from '../../settings.ts';
import { chalkSheetOf, piecesOf, tilesOf } from './service.ts';

/** Prints share one limit per address and one line to wait in, whatever is printed. */
export function printRouter(limits: Limits): Router {
  const router = Router();
  const queue = firstComeQueue(limits.printsWaiting);
  router.use('/api/prints', addressLimit(limits.printsPerMinute));

  const download = async (
    wanted: PrintRequest,
    words: readonly string[],
    extension: string,
    make: (wanted: PrintRequest) => Promise<Uint8Array>,
  ) => ({
    bytes: await queue(() => make(wanted)),
    disposition: attachment(fileName([wanted.card.name, ...words], extension)),
  });

  serve(router, printTiles, (wanted) =>
    download(wanted, [wanted.pieces, wanted.paper], 'pdf', tilesOf),
  );
  serve(router, printChalkSheet, (wanted) =>
    download(wanted, ['chalk-sheet', wanted.paper], 'pdf', chalkSheetOf),
  );
  serve(router, printPieces, (wanted) => download(wanted, [wanted.pieces], 'svg', piecesOf));
  return router;
}
