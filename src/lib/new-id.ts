/** A new random UUID (version 4); `crypto.randomUUID` is missing where a page came over plain http. */
export function newId(): string {
  const bytes = crypto.getRandomValues(new Uint8Array(16));
  bytes[6] = ((bytes[6] ?? 0) & 0x0f) | 0x40;
  bytes[8] = ((bytes[8] ?? 0) & 0x3f) | 0x80;
  const hex = [...bytes].map((byte) => byte.toString(16).padStart(2, '0')).join('');
  return [8, 12, 16, 20, 32]
    .map((end, index, ends) => hex.slice(ends[index - 1] ?? 0, end))
    .join('-');
}
