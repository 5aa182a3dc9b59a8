import { SaxesParser } from 'saxes';

/** An element as it stands in the file. */
export type Read = {
  readonly name: string;
  readonly attributes: Readonly<Record<string, string>>;
  readonly inside: Read[];
  text: string;
};

/** Reads an XML file; throws on anything that is not well formed. */
export function readXml(xml: string): Read {
  const parser = new SaxesParser();
  const top: Read = { name: '', attributes: {}, inside: [], text: '' };
  const open = [top];
  parser.on('error', (error) => {
    throw error;
  });
  parser.on('opentag', ({ name, attributes }) => {
    const read: Read = { name, attributes, inside: [], text: '' };
    open.at(-1)?.inside.push(read);
    open.push(read);
  });
  parser.on('text', (text) => {
    const last = open.at(-1);
    if (last) last.text += text;
  });
  parser.on('closetag', () => open.pop());
  parser.write(xml).close();
  const root = top.inside[0];
  if (!root) throw new Error('The file holds no element.');
  return root;
}

/** The elements of a class directly inside another. */
export const ofClass = (read: Read, name: string): readonly Read[] =>
  read.inside.filter((each) => each.attributes.class === name);
