import type { Draft, DraftInputs } from './draft.ts';
import {
  type BodiceBlockDraft,
  type BodiceBlockInputs,
  draftBodiceBlock,
} from './draft-bodice-block.ts';
import { draftGown } from './draft-gown.ts';
import {
  type SkirtBlockDraft,
  type SkirtBlockInputs,
  draftSkirtBlock,
} from './draft-skirt-block.ts';

/** Whatever has been drafted, told apart by its `garment`. */
export type Drafted = Draft | BodiceBlockDraft | SkirtBlockDraft;

/** What any of them is drafted from; inputs that name no garment are a gown's. */
export type DraftedInputs = DraftInputs | BodiceBlockInputs | SkirtBlockInputs;

/** The garments there are. */
export const garments = ['gown', 'bodice-block', 'skirt-block'] as const;
export type Garment = (typeof garments)[number];

/**
 * Drafts the garment its inputs name. Pure, mm.
 * @throws DraftingError where the inputs are outside their limits; its problems name the fields.
 */
export function draftAny(inputs: DraftedInputs): Drafted {
  switch (inputs.garment) {
    case 'bodice-block':
      return draftBodiceBlock(inputs);
    case 'skirt-block':
      return draftSkirtBlock(inputs);
    case 'gown':
    case undefined:
      return draftGown(inputs);
  }
}
