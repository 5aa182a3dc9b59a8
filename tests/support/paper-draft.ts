import { completeCard } from '#shared/body/complete-card.ts';
import type { MeasureCard } from '#shared/body/card.ts';
import { balanced } from '#shared/drafting/house-rule-presets.ts';
import type { FinishedPiece } from '#shared/drafting/piece.ts';
import type { Draft } from '#shared/engine/draft.ts';

/** A card of ours; nobody's measures. */
export const paperCard: MeasureCard = {
  name: 'Ada Lind',
  date: '2026-11-14',
  bustGirth: 920,
  underbustGirth: 790,
  waistGirth: 740,
  hipGirth: 980,
  bustSpan: 190,
  sideNeckToBustPoint: 270,
  sideNeckToUnderbust: 345,
  frontWaistLength: 435,
  waistToHip: 205,
  waistToFloor: 1050,
};

/** Enough of a draft to print: pieces made by hand, nothing computed from the card but its estimates. */
export const paperDraft = (
  pieces: readonly FinishedPiece[],
  card: MeasureCard = paperCard,
): Draft => ({
  garment: 'gown',
  engine: 'by hand',
  number: '4F2A',
  inputs: { card, style: {}, rules: balanced },
  body: completeCard(card),
  bodyLevels: {
    sideNeckX: 70,
    bustPointX: 95,
    bust: 268,
    underbust: 343,
    underarm: 240,
    nape: 20,
    waist: 433,
    topHip: 535,
    hip: 638,
    knee: 1010,
    floor: 1483,
  },
  style: {
    topLine: 'sweetheart',
    topDrop: 185,
    neckDepth: 220,
    neckWidth: 76,
    sideDepth: 253,
    backDepth: 180,
    dartLength: 127,
    kneeLevel: 100,
    kneeFinished: 762,
    flareFraction: 0.5,
    flareLength: 500,
    floorClearance: 20,
    heelHeight: 60,
    clothWidth: 1400,
    shaping: 'princess',
    ease: { chest: -20, bust: 0, underbust: -15, waist: -10, topHip: 5, hip: 20 },
  },
  levels: {
    chest: 240,
    bust: 268,
    underbust: 343,
    'waist-seam': 357,
    waist: 433,
    'top-hip': 535,
    hip: 638,
    'knee-seam': 910,
    hem: 1410,
  },
  pieces,
  steps: [],
  handles: [],
  construction: { wanted: [], chestSide: { front: 236, back: 224 }, topOpenings: [] },
  walking: {
    step: 480,
    caution: false,
    said: ['The knee seam lets a step of ', { mm: 480 }, ' pass.'],
  },
  warnings: [],
  proof: {
    holds: true,
    verdict: ['These pieces sew together.'],
    lines: [],
    girths: [],
    seams: [],
  },
});
