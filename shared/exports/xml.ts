/** A number with at most three places, as short as it can be written. */
export const figure = (value: number): string => String(Math.round(value * 1000) / 1000 + 0);

const entities: Readonly<Record<string, string>> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
  "'": '&apos;',
};

/** Text safe inside an element or a quoted attribute; characters no XML document may hold are left out. */
export const escapeXml = (text: string): string =>
  text
    .replace(/[\p{Cc}\p{Cs}\ufffe\uffff]/gu, (each) => (/[\t\n\r]/.test(each) ? ' ' : ''))
    .replace(/[&<>"']/g, (each) => entities[each] ?? '');

/** What an attribute may hold; `undefined` leaves it out. */
export type Attributes = Readonly<Record<string, string | number | undefined>>;

/** One element: numbers to a thousandth, everything typed by people escaped, `inside` taken as it is. */
export function element(name: string, attributes: Attributes, inside = ''): string {
  const written = Object.entries(attributes)
    .filter(([, value]) => value !== undefined)
    .map(([key, value]) => {
      const shown = typeof value === 'number' ? figure(value) : escapeXml(value ?? '');
      return ` ${key}="${shown}"`;
    })
    .join('');
  return inside === '' ? `<${name}${written}/>` : `<${name}${written}>${inside}</${name}>`;
}
