import type { MeasureCard } from '../body/card.ts';
import type { LabelFacts } from '../finishing/lettering.ts';

/** What the label of every piece of a draft says: whose card it is, of which day, which draft, cut from what. */
export const labelFacts = (
  garment: 'gown' | 'bodice-block' | 'skirt-block',
  card: Pick<MeasureCard, 'name' | 'date'>,
  draftNumber: string,
): LabelFacts => ({
  cardName: card.name,
  date: card.date,
  draftNumber,
  cloth: garment === 'gown' ? 'cloth' : 'block',
});
