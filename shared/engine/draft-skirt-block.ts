import { drawSkirtBlock } from '../drafts/skirt-block/draw-skirt-block.ts';
import {
  type SkirtBlockCard,
  type SkirtBlockStyle,
  checkSkirtBlock,
  resolveSkirtBlock,
} from '../drafts/skirt-block/style-card.ts';
import { type BlockDraft, type BlockInputs, draftBlock } from './block-draft.ts';

/** The three inputs of a skirt block. */
export type SkirtBlockInputs = BlockInputs<'skirt-block', SkirtBlockCard>;
/** A skirt block drafted, finished and proven. */
export type SkirtBlockDraft = BlockDraft<'skirt-block', SkirtBlockCard, SkirtBlockStyle>;

/**
 * Drafts a straight skirt block, front and back (method section 5), mm.
 * @throws DraftingError where the inputs are outside their limits; its problems name the fields.
 */
export const draftSkirtBlock = (inputs: Omit<SkirtBlockInputs, 'garment'>): SkirtBlockDraft =>
  draftBlock(
    {
      garment: 'skirt-block',
      check: checkSkirtBlock,
      resolve: resolveSkirtBlock,
      draw: drawSkirtBlock,
    },
    inputs,
  );
