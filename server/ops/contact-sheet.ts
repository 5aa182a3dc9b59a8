import { parseArgs } from 'node:util';
import type { MeasureCard } from '#shared/body/card.ts';
import { type SampleName, sampleCards } from '#shared/body/sample-cards.ts';
import { DraftingError } from '#shared/drafting/drafting-error.ts';
import { balanced } from '#shared/drafting/house-rule-presets.ts';
import { type DraftedInputs, type Garment, draftAny, garments } from '#shared/engine/drafted.ts';
import { type Contact, type ContactRow, contactSheet } from '#shared/exports/contact-sheet.ts';
import { speak } from '#shared/units/speak.ts';
import { contactStyles } from './contact-styles.ts';
import { writeFiles } from './write-files.ts';

/** The bodies of the sheet and what each is there for, from left to right. */
const bodies: Readonly<Record<SampleName, string>> = {
  tamsin: 'petite',
  judith: 'middle figure',
  philippa: 'tall and slender',
  bridget: 'full bust',
  lotte: 'fuller hip',
};

const titles: Readonly<Record<Garment, string>> = {
  gown: 'Gown: every choice of the style card',
  'bodice-block': 'Bodice block: every choice of the style card',
  'skirt-block': 'Skirt block: every choice of the style card',
};

function contactOf(inputs: DraftedInputs): Contact {
  try {
    const { pieces, proof } = draftAny(inputs);
    return { pieces, fault: proof.holds ? undefined : speak(proof.verdict, 'cm') };
  } catch (error) {
    if (!(error instanceof DraftingError)) throw error;
    return { pieces: [], fault: error.problems.map(({ said }) => speak(said, 'cm')).join(' ') };
  }
}

const cardOf = (name: string): MeasureCard =>
  sampleCards[
    Object.keys(sampleCards).find((each): each is SampleName => each === name) ?? 'judith'
  ];

/** Draws the sheet of one garment; only rows whose title holds `only`. */
function sheetOf(garment: Garment, only: string): string {
  const rows = contactStyles[garment]
    .filter(({ title }) => title.toLowerCase().includes(only.toLowerCase()))
    .map(({ title, inputs }): ContactRow => ({
      title,
      contacts: Object.keys(bodies).map((body) => contactOf(inputs(cardOf(body), balanced))),
    }));
  const columns = Object.entries(bodies).map(
    ([name, words]) => `${cardOf(name).name ?? ''}: ${words}`,
  );
  return contactSheet(titles[garment], columns, rows);
}

const { values } = parseArgs({
  options: {
    out: { type: 'string', default: 'docs' },
    garment: { type: 'string' },
    only: { type: 'string', default: '' },
  },
});

const wanted = garments.filter((each) => values.garment === undefined || each === values.garment);
if (wanted.length === 0) {
  console.error(
    `--garment must be one of ${garments.join(', ')}; it is “${values.garment ?? ''}”.`,
  );
  process.exitCode = 2;
}
for (const garment of wanted) {
  writeFiles(values.out, { [`contact-sheet-${garment}.svg`]: sheetOf(garment, values.only) });
  console.log(`${values.out}/contact-sheet-${garment}.svg`);
}
