import { Link } from 'react-router-dom';

import type { KeptCard } from '#shared/api/measure-cards.ts';
import { coreMeasures, furtherMeasures } from '#shared/body/card.ts';
import { measureGuide } from '#shared/body/measure-guide.ts';
import { dayInWords } from '#shared/exports/day.ts';
import { formatAngle, formatWithUnit } from '#shared/units/format-length.ts';

import { CardRow } from './card-row.tsx';

/** A card that gowns were drawn from: it is read and goes on in the next one, and is not changed. */
export const UsedCard = ({ card }: { card: KeptCard }) => {
  const { typed, card: measures } = card.content;
  return (
    <main id="content" className="mx-auto w-full max-w-xl grow px-4 py-8">
      <title>{`Ellwand · ${card.name}`}</title>
      <p>
        <Link to={`/clients/${card.person.id}`} className="text-brass underline underline-offset-4">
          {card.person.name}
        </Link>
      </p>
      <h1 className="text-3xl font-semibold">{card.name}</h1>
      <ul className="mt-4 border-t border-rule">
        <CardRow card={card} />
      </ul>
      <table className="figures mt-4 w-full">
        <caption className="text-left font-semibold">
          {`As measured on ${dayInWords(card.takenOn)}`}
        </caption>
        <tbody>
          {[...coreMeasures, ...furtherMeasures].flatMap((key) => {
            const value = measures[key];
            if (value === undefined) return [];
            const { label, kind } = measureGuide[key];
            return [
              <tr key={key} className="border-t border-rule">
                <th scope="row" className="py-1 text-left font-normal">
                  {label}
                </th>
                <td className="text-right">
                  {kind === 'angle' ? formatAngle(value) : formatWithUnit(value, typed.unit)}
                </td>
              </tr>,
            ];
          })}
        </tbody>
      </table>
    </main>
  );
};
