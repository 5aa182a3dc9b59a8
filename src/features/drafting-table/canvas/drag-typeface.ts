import file from '@fontsource/source-sans-3/files/source-sans-3-latin-600-normal.woff2?url';

const family = 'Source Sans 3';

/** A thread has no style sheet, so it fetches the page's typeface itself. */
const typeface = new FontFace(family, `url(${file})`, { weight: '600' });
void typeface.load().then((loaded) => ownFonts().add(loaded));

/** The types are those of a page, where the set of fonts is the document's. */
function ownFonts(): FontFaceSet {
  return Reflect.get(globalThis, 'fonts') as FontFaceSet;
}

/** The family to letter with: the system's until ours is here. A canvas told one name twice does not look again. */
export const letterFamily = (): string =>
  typeface.status === 'loaded' ? `"${family}"` : 'sans-serif';
