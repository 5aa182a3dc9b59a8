/** Longest file name offered, in characters; older file systems hold 255 bytes. */
const longest = 60;

/**
 * A download's file name made from words a person typed: letters, digits and hyphens of any
 * script, so that it can neither leave the folder nor the header.
 */
export function fileName(words: readonly (string | undefined)[], extension: string): string {
  const stem = words
    .map((each) => (each ?? '').normalize('NFC').replace(/[^\p{L}\p{M}\p{N}]+/gu, '-'))
    .join('-')
    .replace(/-+/g, '-')
    .replace(/^-|-$/g, '');
  const short = Array.from(stem).slice(0, longest).join('').replace(/-$/, '');
  return `${short === '' ? 'ellwand' : short.toLowerCase()}.${extension}`;
}

/** Content-Disposition of a download: plain ASCII for old readers, the true name as RFC 5987. */
export function attachment(name: string): string {
  const plain = name
    .normalize('NFKD')
    .replace(/\p{M}/gu, '')
    .replace(/[^\w.-]/g, '_');
  const encoded = encodeURIComponent(name).replace(
    /['()*!]/g,
    (sign) => `%${sign.charCodeAt(0).toString(16).toUpperCase()}`,
  );
  return `attachment; filename="${plain}"; filename*=UTF-8''${encoded}`;
}
