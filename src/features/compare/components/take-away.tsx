import { useMutation } from '@tanstack/react-query';
import { useEffect, useState } from 'react';

import { type Stack } from '#shared/exports/overlaid.ts';
import { stackSheets } from '#shared/exports/stack-pages.ts';
import type { PaperName } from '#shared/sheets/papers.ts';

import type { SentFile } from '../../../lib/call.ts';
import { failureWords } from '../../../lib/failure-words.ts';
import { printsOnLetter } from '../../../lib/reader.ts';
import { saveFile } from '../../../lib/save-file.ts';
import { Button } from '../../../ui/button.tsx';
import { Notice } from '../../../ui/notice.tsx';
import { Segmented } from '../../../ui/segmented.tsx';

/** True scale on sheets to glue, or a quarter of it. */
export type TakenScale = 1 | 0.25;

type TakeAwayProps = {
  readonly stacks: readonly Stack[];
  readonly svg: () => { readonly text: string; readonly name: string };
  readonly pdf: (on: {
    readonly paper: PaperName;
    readonly scale: TakenScale;
  }) => Promise<SentFile>;
};

const scales = [
  { scale: 0.25, label: 'PDF, quarter scale' },
  { scale: 1, label: 'PDF, true scale' },
] as const;

/** How many sheets each scale takes; counted when the page is still, as it takes a moment. */
function useSheets(stacks: readonly Stack[], paper: PaperName, open: boolean) {
  const [sheets, setSheets] = useState<Readonly<Record<string, number>>>({});
  useEffect(() => {
    setSheets({});
    if (!open) return;
    const timers = scales.map(({ scale }, index) =>
      setTimeout(
        () => {
          const count = stackSheets(stacks, { paper, scale });
          setSheets((now) => ({ ...now, [scale]: count }));
        },
        50 * (index + 1),
      ),
    );
    return () => timers.forEach(clearTimeout);
  }, [stacks, paper, open]);
  return sheets;
}

/** What lies here as files: SVG, and pages at a quarter of the scale or at true scale. */
export const TakeAway = ({ stacks, svg, pdf }: TakeAwayProps) => {
  const [open, setOpen] = useState(false);
  const [paper, setPaper] = useState<PaperName>(printsOnLetter() ? 'Letter' : 'A4');
  const sheets = useSheets(stacks, paper, open);
  const printing = useMutation({
    mutationFn: (scale: TakenScale) => pdf({ paper, scale }),
    onSuccess: ({ blob, name }) => saveFile(blob, name ?? 'ellwand.pdf'),
  });
  const saveSvg = () => {
    const { text, name } = svg();
    saveFile(new Blob([text], { type: 'image/svg+xml' }), name);
  };
  return (
    <details onToggle={(event) => setOpen(event.currentTarget.open)}>
      <summary className="w-fit py-1 font-semibold text-brass">Keep or print</summary>
      <div className="mt-2 flex flex-wrap items-center gap-3">
        <Segmented
          legend="Paper"
          choices={[
            { value: 'A4', label: 'A4' },
            { value: 'Letter', label: 'Letter' },
          ]}
          value={paper}
          onChoose={setPaper}
        />
        <Button onClick={saveSvg}>SVG, true scale</Button>
        {scales.map(({ scale, label }) => (
          <Button key={scale} disabled={printing.isPending} onClick={() => printing.mutate(scale)}>
            {sheets[scale] === undefined
              ? label
              : `${label}: ${sheets[scale]} ${sheets[scale] === 1 ? 'sheet' : 'sheets'} and the figures`}
          </Button>
        ))}
        <span role="status">{printing.isPending && 'Writing the pages…'}</span>
      </div>
      {printing.isError && <Notice>{failureWords(printing.error)}</Notice>}
    </details>
  );
};
