import { drawBodiceBlock } from '../drafts/bodice-block/draw-bodice-block.ts';
import {
  type BodiceBlockCard,
  type BodiceBlockStyle,
  checkBodiceBlock,
  resolveBodiceBlock,
} from '../drafts/bodice-block/style-card.ts';
import { type BlockDraft, type BlockInputs, draftBlock } from './block-draft.ts';

/** The three inputs of a bodice block. */
export type BodiceBlockInputs = BlockInputs<'bodice-block', BodiceBlockCard>;
/** A bodice block drafted, finished and proven. */
export type BodiceBlockDraft = BlockDraft<'bodice-block', BodiceBlockCard, BodiceBlockStyle>;

/**
 * Drafts a bodice block, front and back (method section 5), mm.
 * @throws DraftingError where the inputs are outside their limits; its problems name the fields.
 */
export const draftBodiceBlock = (inputs: Omit<BodiceBlockInputs, 'garment'>): BodiceBlockDraft =>
  draftBlock(
    {
      garment: 'bodice-block',
      check: checkBodiceBlock,
      resolve: resolveBodiceBlock,
      draw: drawBodiceBlock,
    },
    inputs,
  );
