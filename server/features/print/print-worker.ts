import { answerOrders } from '../../http/thread-work.ts';
import { comparisonOf, comparisonSvgOf, nestPdfOf, nestSvgOf } from './overlays.ts';
import type { PrintTask } from './print-task.ts';
import { chalkSheetOf, piecesOf, sheetsOf, sheetsSvgOf, tilesOf } from './service.ts';
import { worksheetOf } from './worksheet-pdf.ts';

answerOrders((posted) => {
  const task = taskIn(posted);
  switch (task.what) {
    case 'tiles':
      return tilesOf(task.wanted);
    case 'chalk-sheet':
      return chalkSheetOf(task.wanted);
    case 'pieces':
      return piecesOf(task.wanted);
    case 'sheets':
      return sheetsOf(task.wanted);
    case 'sheets-svg':
      return sheetsSvgOf(task.wanted);
    case 'comparison':
      return comparisonOf(task.wanted);
    case 'comparison-svg':
      return comparisonSvgOf(task.wanted);
    case 'nest':
      return nestPdfOf(task.wanted);
    case 'nest-svg':
      return nestSvgOf(task.wanted);
    case 'worksheet':
      return worksheetOf(task.wanted);
  }
});

/** The printer posts nothing else. */
function taskIn(posted: unknown): PrintTask {
  return posted as PrintTask;
}
