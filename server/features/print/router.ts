import { Router } from 'express';
import type { Endpoint } from '#shared/api/endpoint.ts';
import {
  printChalkSheet,
  printPieces,
  printSheets,
  printSheetsSvg,
  printTiles,
} from '#shared/api/drafts.ts';
import type { PrintRequest, SheetsRequest } from '#shared/api/requests.ts';
import { printWorksheet } from '#shared/api/worksheet.ts';
import type { Garment } from '#shared/engine/drafted.ts';
import { paperOf } from '#shared/sheets/papers.ts';
import type { Selection } from '#shared/sheets/selection.ts';
import { addressLimit } from '../../http/address-limit.ts';
import { attachment, fileName } from '../../http/file-name.ts';
import { type Asked, type Download, serve } from '../../http/serve.ts';
import { turnOf } from '../../http/turn-of.ts';
import type { Limits } from '../../settings.ts';
import type { PrintTask } from './print-task.ts';
import type { Printer } from './printer.ts';
import { serveOverlays } from './serve-overlays.ts';

/** Prints share one limit per address and one line to wait in, whatever is printed. */
export function printRouter(limits: Limits, printer: Printer): Router {
  const router = Router();
  router.use('/api/prints', addressLimit(limits.printsPerMinute));

  const download = async (
    task: PrintTask,
    { request, response }: Pick<Asked<Endpoint>, 'request' | 'response'>,
    name: string,
  ): Promise<Download> => ({
    bytes: await printer.print(task, turnOf(request, response)),
    disposition: attachment(name),
  });

  const whatOf = (garment: Garment | undefined, pieces: Selection): string =>
    garment === undefined || garment === 'gown' ? pieces : garment;
  const named = ({ card }: PrintRequest, words: readonly string[], extension: string) =>
    fileName([card.name, ...words], extension);

  serve(router, printTiles, (wanted, asked) =>
    download(
      { what: 'tiles', wanted },
      asked,
      named(wanted, [whatOf(wanted.garment, wanted.pieces), wanted.paper], 'pdf'),
    ),
  );
  serve(router, printChalkSheet, (wanted, asked) =>
    download(
      { what: 'chalk-sheet', wanted },
      asked,
      named(wanted, ['chalk-sheet', wanted.paper], 'pdf'),
    ),
  );
  serve(router, printPieces, (wanted, asked) =>
    download(
      { what: 'pieces', wanted },
      asked,
      named(wanted, [whatOf(wanted.garment, wanted.pieces)], 'svg'),
    ),
  );
  const sheetsNamed = ({ inputs, order }: SheetsRequest, extension: 'pdf' | 'svg') => {
    const { pieces } = order;
    const what = typeof pieces === 'string' ? whatOf(inputs.garment, pieces) : 'pieces';
    const scale = order.scale === 1 ? [] : [`scale 1 ${1 / order.scale}`];
    const onPaper = extension === 'svg' ? [] : [paperOf(order.paper).name, ...scale];
    return fileName([inputs.card.name, what, ...onPaper], extension);
  };
  serve(router, printSheets, (wanted, asked) =>
    download({ what: 'sheets', wanted }, asked, sheetsNamed(wanted, 'pdf')),
  );
  serve(router, printSheetsSvg, (wanted, asked) =>
    download({ what: 'sheets-svg', wanted }, asked, sheetsNamed(wanted, 'svg')),
  );
  serve(router, printWorksheet, (wanted, asked) =>
    download(
      { what: 'worksheet', wanted },
      asked,
      fileName([wanted.inputs.card.name, 'worksheet', wanted.paper], 'pdf'),
    ),
  );
  serveOverlays(router, download);
  return router;
}
