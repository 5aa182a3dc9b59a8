import type { Piece } from '#shared/drafting/piece.ts';

type Named = Pick<Piece, 'name' | 'title' | 'side' | 'part'>;

/**
 * A piece's name where there is little room. Front or back is never dropped: `Front CF`, `Back side`,
 * `Front skirt`, `Flare B gore 2`.
 */
export function shortTitle({ name, title, side, part }: Named): string {
  const front = side === 'front';
  if (name.startsWith('lining-')) return `Lining ${shortTitle(lined({ name, title, side, part }))}`;
  if (part === 'sleeve' || part === 'inner') return title.split(',')[0] ?? title;
  if (name.startsWith('godet-')) return godetTitle(name);
  if (part === 'flare') {
    const gore = /-(\d+)$/.exec(name)?.[1];
    const centre = title.includes('centre gore') ? ' centre' : '';
    return `Flare ${front ? 'F' : 'B'}${gore === undefined ? centre : ` gore ${gore}`}`;
  }
  const half = front ? 'Front' : 'Back';
  if (title.includes(' block, ')) return half;
  if (part === 'middle') return `${half} skirt`;
  if (name.endsWith('-centre')) return `${half} ${front ? 'CF' : 'CB'}`;
  return name.endsWith('-side') ? `${half} side` : `${half} top`;
}

/** A godet by the seam it stands in: `Godet CB`, `Godet princess F`, and the half where it is cut in two. */
function godetTitle(name: string): string {
  const [place = name, half = ''] = name.slice('godet-'.length).split(/-(?=[ab]$)/);
  const words: Readonly<Record<string, string>> = {
    side: 'side',
    'centre-back': 'CB',
    'front-princess': 'princess F',
    'back-princess': 'princess B',
  };
  return `Godet ${words[place] ?? place}${half === '' ? '' : ` ${half}`}`;
}

/** The piece of the gown a lining lies under. */
function lined({ name, ...piece }: Named): Named {
  const under = name.slice('lining-'.length);
  const part = under.startsWith('flare') ? 'flare' : under.endsWith('middle') ? 'middle' : 'top';
  return { ...piece, name: under, part };
}
