import {
  printComparison,
  printComparisonSvg,
  printNest,
  printNestSvg,
} from '#shared/api/comparing.ts';
import type { Endpoint } from '#shared/api/endpoint.ts';
import { fileName } from '../../http/file-name.ts';
import { type Asked, type Download, serve } from '../../http/serve.ts';
import type { PrintTask } from './print-task.ts';

/** How a task becomes a file that is offered under a name. */
type Downloads = (
  task: PrintTask,
  asked: Pick<Asked<Endpoint>, 'request' | 'response'>,
  name: string,
) => Promise<Download>;

/** Drafts over each other, and nests; they wait in the line of all prints. */
export function serveOverlays(router: Parameters<typeof serve>[0], download: Downloads): void {
  const onPaper = ({ paper, scale }: { readonly paper: string; readonly scale: number }) =>
    scale === 1 ? [paper] : [`scale 1 to ${1 / scale}`, paper];

  serve(router, printComparison, (wanted, asked) => {
    const { first, second } = wanted.names;
    const name = fileName([first, 'and', second, ...onPaper(wanted)], 'pdf');
    return download({ what: 'comparison', wanted }, asked, name);
  });
  serve(router, printComparisonSvg, (wanted, asked) => {
    const { first, second } = wanted.names;
    return download(
      { what: 'comparison-svg', wanted },
      asked,
      fileName([first, 'and', second], 'svg'),
    );
  });
  serve(router, printNest, (wanted, asked) => {
    const { card } = wanted.inputs;
    const name = fileName([card.name, 'nest', ...onPaper(wanted)], 'pdf');
    return download({ what: 'nest', wanted }, asked, name);
  });
  serve(router, printNestSvg, (wanted, asked) =>
    download(
      { what: 'nest-svg', wanted },
      asked,
      fileName([wanted.inputs.card.name, 'nest'], 'svg'),
    ),
  );
}
