import { answerOrders } from '../../http/thread-work.ts';
import type { PrintOrder } from './print-order.ts';
import { chalkSheetOf, piecesOf, tilesOf } from './service.ts';

const makers = { tiles: tilesOf, 'chalk-sheet': chalkSheetOf, pieces: piecesOf };

answerOrders((posted) => {
  const { what, wanted } = orderIn(posted);
  return makers[what](wanted);
});

/** The printer posts nothing else. */
function orderIn(posted: unknown): PrintOrder {
  return posted as PrintOrder;
}
