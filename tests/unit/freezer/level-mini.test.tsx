// @vitest-environment happy-dom
import { cleanup, render } from '@testing-library/react';
import { afterEach, expect, test } from 'vitest';
import { LevelMini } from '../../../src/freezer/level-mini';

afterEach(cleanup);

test('a column a lane, no higher than full, with its words', () => {
  const { container, getByRole } = render(<LevelMini label="7 lb 130%, 20 lb 50%" lanes={[{ share: 1.3, low: false }, { share: 0.5, low: false }]} />);
  const heights = [...container.querySelectorAll('.fill-fjord-2')].map((column) => Number(column.getAttribute('height')));
  // 30 high, 3 of frame above and below.
  expect(heights).toEqual([24, 12]);
  expect(getByRole('img').getAttribute('aria-label')).toBe('7 lb 130%, 20 lb 50%');
});

test('a low lane differs in colour and in shape; an empty one is still seen', () => {
  const { container } = render(<LevelMini label="low" lanes={[{ share: 0.2, low: true }, { share: 0, low: true }]} />);
  expect(container.querySelectorAll('.fill-ember')).toHaveLength(2);
  expect(container.querySelectorAll('path[stroke-dasharray]')).toHaveLength(1);
  expect(Number(container.querySelectorAll('.fill-ember')[1]?.getAttribute('height'))).toBeGreaterThan(0);
});

test('a lane that nobody measures leaves its place bare', () => {
  const { container } = render(<LevelMini label="one" lanes={[{ share: null, low: false }, { share: 1, low: false }]} />);
  const columns = container.querySelectorAll('.fill-fjord-2');
  expect(columns).toHaveLength(1);
  expect(Number(columns[0]?.getAttribute('x'))).toBeGreaterThan(32);
});
