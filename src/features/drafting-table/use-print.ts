import { useSentFile } from '../../lib/use-sent-file.ts';
import { fetchPrint, type PrintOrder } from './queries.ts';

/** One print on its way from the table. */
export const usePrint = () => useSentFile<PrintOrder>({ fetchFile: fetchPrint, fallbackName });

const fallbackName = ({ kind, draft }: PrintOrder): string =>
  kind === 'pieces.svg' ? `ellwand-${draft.number}.svg` : `ellwand-${draft.number}-${kind}.pdf`;
