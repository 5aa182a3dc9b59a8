import { Router } from 'express';
import type { Endpoint } from '#shared/api/endpoint.ts';
import { printChalkSheet, printPieces, printTiles } from '#shared/api/drafts.ts';
import type { PrintRequest } from '#shared/api/requests.ts';
import { addressLimit } from '../../http/address-limit.ts';
import { attachment, fileName } from '../../http/file-name.ts';
import { type Asked, type Download, serve } from '../../http/serve.ts';
import { turnOf } from '../../http/turn-of.ts';
import type { Limits } from '../../settings.ts';
import type { PrintOrder } from './print-order.ts';
import type { Printer } from './printer.ts';

/** Prints share one limit per address and one line to wait in, whatever is printed. */
export function printRouter(limits: Limits, printer: Printer): Router {
  const router = Router();
  router.use('/api/prints', addressLimit(limits.printsPerMinute));

  const download = async (
    order: PrintOrder,
    { request, response }: Pick<Asked<Endpoint>, 'request' | 'response'>,
    name: string,
  ): Promise<Download> => ({
    bytes: await printer.print(order, turnOf(request, response)),
    disposition: attachment(name),
  });

  const named = ({ card }: PrintRequest, words: readonly string[], extension: string) =>
    fileName([card.name, ...words], extension);

  serve(router, printTiles, (wanted, asked) =>
    download({ what: 'tiles', wanted }, asked, named(wanted, [wanted.pieces, wanted.paper], 'pdf')),
  );
  serve(router, printChalkSheet, (wanted, asked) =>
    download(
      { what: 'chalk-sheet', wanted },
      asked,
      named(wanted, ['chalk-sheet', wanted.paper], 'pdf'),
    ),
  );
  serve(router, printPieces, (wanted, asked) =>
    download({ what: 'pieces', wanted }, asked, named(wanted, [wanted.pieces], 'svg')),
  );
  return router;
}
