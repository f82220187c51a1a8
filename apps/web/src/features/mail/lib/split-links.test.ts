import { expect, it } from 'vitest';
import { splitLinks } from './split-links.ts';

it('finds addresses and nothing else', () => {
  expect(
    splitLinks('Open\nhttp://127.0.0.1:4310/reset-password#token=ab_c\nnow, javascript:alert(1)'),
  ).toEqual([
    { text: 'Open\n', isLink: false },
    { text: 'http://127.0.0.1:4310/reset-password#token=ab_c', isLink: true },
    { text: '\nnow, javascript:alert(1)', isLink: false },
  ]);
});
