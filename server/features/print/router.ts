import { Router, type Request } from 'express';
import { printChalkSheet, printPieces, printTiles } from '#shared/api/drafts.ts';
import type { PrintRequest } from '#shared/api/requests.ts';
import { addressLimit } from '../../http/address-limit.ts';
import { attachment, fileName } from '../../http/file-name.ts';
import { type Download, serve } from '../../http/serve.ts';
import type { Limits } from '../../settings.ts';
import type { PrintOrder } from './print-order.ts';
import type { Printer } from './printer.ts';

/** Prints share one limit per address and one line to wait in, whatever is printed. */
export function printRouter(limits: Limits, printer: Printer): Router {
  const router = Router();
  router.use('/api/prints', addressLimit(limits.printsPerMinute));

  const download = async (
    order: PrintOrder,
    request: Request,
    name: string,
  ): Promise<Download> => ({
    bytes: await printer.print(order, () => !request.socket.destroyed),
    disposition: attachment(name),
  });

  const named = ({ card }: PrintRequest, words: readonly string[], extension: string) =>
    fileName([card.name, ...words], extension);

  serve(router, printTiles, (wanted, request) =>
    download(
      { what: 'tiles', wanted },
      request,
      named(wanted, [wanted.pieces, wanted.paper], 'pdf'),
    ),
  );
  serve(router, printChalkSheet, (wanted, request) =>
    download(
      { what: 'chalk-sheet', wanted },
      request,
      named(wanted, ['chalk-sheet', wanted.paper], 'pdf'),
    ),
  );
  serve(router, printPieces, (wanted, request) =>
    download({ what: 'pieces', wanted }, request, named(wanted, [wanted.pieces], 'svg')),
  );
  return router;
}
