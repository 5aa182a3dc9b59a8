import type { MeasureCard } from '../body/card.ts';
import type { HouseRules } from '../drafting/house-rules.ts';
import type { LabelFacts } from '../finishing/lettering.ts';

/** What the label of every piece of a draft says: whose card it is, of which day, which draft, cut from what, as far as the house wants it. */
export const labelFacts = (
  garment: 'gown' | 'bodice-block' | 'skirt-block',
  card: Pick<MeasureCard, 'name' | 'date'>,
  draftNumber: string,
  { label }: Pick<HouseRules, 'label'>,
): LabelFacts => ({
  cardName: card.name,
  date: card.date,
  draftNumber,
  cloth: garment === 'gown' ? 'cloth' : 'block',
  size: 'made to measure',
  ...(label && { says: label }),
});
