import { describe, expect, it } from 'vitest';
import { sortOut } from '../../../src/features/stores/photos';

const file = (name: string, type = 'image/jpeg', bytes = 3) => new File([new Uint8Array(bytes)], name, { type });
const tenMiB = 10 * 1024 * 1024;

describe('photos beside a report', () => {
  it('takes JPEG, PNG and WebP', () => {
    const all = [file('a.jpg'), file('b.png', 'image/png'), file('c.webp', 'image/webp')];
    expect(sortOut(all)).toEqual({ taken: all, refusals: [] });
  });

  it('names what it leaves out', () => {
    const good = file('a.jpg');
    expect(sortOut([good, file('b.heic', 'image/heic'), file('c.svg', 'image/svg+xml')])).toEqual({
      taken: [good],
      refusals: [
        { key: 'refused', name: 'b.heic' },
        { key: 'refused', name: 'c.svg' },
      ],
    });
  });

  it('takes exactly 10 MiB, and no byte more', () => {
    expect(sortOut([file('a.jpg', 'image/jpeg', tenMiB)]).taken).toHaveLength(1);
    expect(sortOut([file('a.jpg', 'image/jpeg', tenMiB + 1)]).taken).toHaveLength(0);
  });

  it('takes five of seven and says so once', () => {
    const many = Array.from({ length: 7 }, (_, i) => file(`${i}.jpg`));
    expect(sortOut(many)).toEqual({ taken: many.slice(0, 5), refusals: [{ key: 'full' }] });
  });
});
