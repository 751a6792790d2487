import { describe, expect, test } from 'vitest';
import { fieldOf } from '../../../src/form/pointer';

describe('a JSON pointer names a field of the form', () => {
  test.each([
    ['/words', 'words'],
    ['/lines/0/bags', 'lines.0.bags'],
    // RFC 6901, section 5: `~1` is a slash and `~0` a tilde, decoded in that order.
    ['/a~1b', 'a/b'],
    ['/m~0n', 'm~n'],
    ['/~01', '~1'],
  ])('%s is %s', (pointer, name) => {
    expect(fieldOf(pointer)).toBe(name);
  });

  test.each(['', '/query/limit', '/path/id', '/query'])('%j is outside the body', (pointer) => {
    expect(fieldOf(pointer)).toBeNull();
  });
});
