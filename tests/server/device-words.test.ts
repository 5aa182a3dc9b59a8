import { describe, expect, it } from 'vitest';
import { deviceWords } from '#server/http/device-words.ts';

const webkit = 'AppleWebKit/537.36 (KHTML, like Gecko)';

describe('a browser is told in words', () => {
  it.each([
    [
      `Mozilla/5.0 (Windows NT 10.0; Win64; x64) ${webkit} Chrome/140.0 Safari/537.36`,
      'Chrome on Windows',
    ],
    [
      `Mozilla/5.0 (Windows NT 10.0) ${webkit} Chrome/140.0 Safari/537.36 Edg/140.0`,
      'Edge on Windows',
    ],
    [
      `Mozilla/5.0 (Linux; Android 10; K) ${webkit} Chrome/140.0 Mobile Safari/537.36`,
      'Chrome on Android',
    ],
    [
      'Mozilla/5.0 (Macintosh; Intel Mac OS X 10_15_7) AppleWebKit/605 Version/18.5 Safari/605',
      'Safari on Mac',
    ],
    [
      'Mozilla/5.0 (iPhone; CPU iPhone OS 18_5 like Mac OS X) CriOS/140.0 Safari/604',
      'Chrome on iPhone',
    ],
    ['Mozilla/5.0 (X11; Linux x86_64; rv:143.0) Gecko/20100101 Firefox/143.0', 'Firefox on Linux'],
    ['curl/7.88.1', 'A browser on some device'],
    [undefined, 'A browser on some device'],
  ])('%s', (userAgent, words) => {
    expect(deviceWords(userAgent)).toBe(words);
  });
});
