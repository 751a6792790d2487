import { describe, expect, test } from 'vitest';
import { api } from '../../../server/contract/index';
import { logoFault } from '../../../src/features/settings/logo-fault';
import { percentText, shareOf } from '../../../src/features/settings/percent';

describe('a share in percent', () => {
  test.each([
    ['25', 0.25],
    [' 12.5 % ', 0.125],
    ['12,5', 0.125],
    ['0', 0],
  ])('%j is %d', (text, share) => expect(shareOf(text)).toBe(share));

  test.each(['', ' ', '%', 'ten', '1.2.3'])('%j is left for the contract, which refuses it in words', (text) => {
    expect(shareOf(text)).toBe(text);
    const parsed = api.settings.change.body.safeParse({ version: 1, riskLimit: shareOf(text) });
    expect(parsed.error?.issues[0]?.message).toBe('risk-limit');
  });

  test('every whole percent comes back as it was entered', () => {
    for (let percent = 10; percent <= 50; percent++) expect(percentText(shareOf(String(percent)))).toBe(String(percent));
  });
});

test('an answer address that is none is refused in words, none at all is fine', () => {
  const faults = (replyTo: string) => api.settings.change.body.safeParse({ version: 1, mailSender: { name: '', replyTo } }).error?.issues.map(({ message }) => message);
  expect(faults('not an address')).toEqual(['email']);
  expect(faults('')).toBeUndefined();
});

describe('a logo', () => {
  test('is PNG, JPEG or WebP of up to 2 MB', () => {
    expect(logoFault({ type: 'image/png', size: 2_000_000 })).toBeNull();
    expect(logoFault({ type: 'image/webp', size: 2_000_001 })).toBe('too-large');
    expect(logoFault({ type: 'image/svg+xml', size: 10 })).toBe('wrong-kind');
  });
});
