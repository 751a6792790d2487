import { expect, test } from 'vitest';
import { foldedWords, searchText } from '../../../server/domain/folded-words';

test('letters and digits, small, without accents', () => {
  expect(foldedWords('Hielería Ñandú', '555-0123')).toEqual(['hieleria', 'nandu', '555', '0123']);
  expect(foldedWords('urn:dev:os:32473-kb-0001')).toEqual(['urn', 'dev', 'os', '32473', 'kb', '0001']);
  expect(foldedWords(' - ', '…')).toEqual([]);
});

test('each word stands after a space', () => {
  expect(searchText('Ozark Lane', 'Elm St.')).toBe(' ozark lane elm st');
});
