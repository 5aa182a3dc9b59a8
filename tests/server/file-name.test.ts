import { describe, expect, it } from 'vitest';
import { attachment, fileName } from '#server/http/file-name.ts';

describe('a download is named after the card without trusting it', () => {
  it.each([
    ['../../etc/passwd', 'etc-passwd-tiles.pdf'],
    ['<script>alert(1)</script>', 'script-alert-1-script-tiles.pdf'],
    ['Ana\r\nSet-Cookie: a=b', 'ana-set-cookie-a-b-tiles.pdf'],
    ['"; filename="evil.exe', 'filename-evil-exe-tiles.pdf'],
    ['\ud800 broken', 'broken-tiles.pdf'],
    ['Žofie Nováková', 'žofie-nováková-tiles.pdf'],
    ['   ', 'tiles.pdf'],
    [undefined, 'tiles.pdf'],
  ])('%j becomes %s', (name, expected) => {
    expect(fileName([name, 'tiles'], 'pdf')).toBe(expected);
  });

  it('a name of nothing but signs still gives a file', () => {
    expect(fileName(['***'], 'svg')).toBe('ellwand.svg');
  });

  it('a very long name is cut', () => {
    expect(fileName(['a'.repeat(500)], 'pdf')).toBe(`${'a'.repeat(60)}.pdf`);
  });

  it('the header holds plain ASCII, and the true name beside it (RFC 5987)', () => {
    const header = attachment('žofie-tiles.pdf');
    expect(header).toBe(
      `attachment; filename="zofie-tiles.pdf"; filename*=UTF-8''%C5%BEofie-tiles.pdf`,
    );
    expect(attachment('裁縫.pdf')).toMatch(/^[\x20-\x7e]+$/);
  });
});
