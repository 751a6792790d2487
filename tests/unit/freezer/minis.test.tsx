// @vitest-environment happy-dom
import { cleanup, render } from '@testing-library/react';
import { afterEach, describe, expect, test } from 'vitest';
import { LevelMini, SpanMini } from '../../../src/freezer/minis';

afterEach(cleanup);

const day = 86_400_000;
const now = Date.parse('2026-12-01T19:10:00Z');

describe('the level in a row', () => {
  test('a column a lane, no higher than full, with its words', () => {
    const { container, getByRole } = render(<LevelMini label="7 lb 130%, 20 lb 50%" lanes={[{ share: 1.3, low: false }, { share: 0.5, low: false }]} />);
    const heights = [...container.querySelectorAll('.fill-fjord-2')].map((column) => Number(column.getAttribute('height')));
    // 30 high, 3 of frame above and below.
    expect(heights).toEqual([24, 12]);
    expect(getByRole('img').getAttribute('aria-label')).toBe('7 lb 130%, 20 lb 50%');
  });

  test('a low lane differs in colour and in shape; an empty one is still seen', () => {
    const { container } = render(<LevelMini label="low" lanes={[{ share: 0.3, low: true }, { share: 0, low: true }]} />);
    expect(container.querySelectorAll('.fill-ember')).toHaveLength(2);
    expect(container.querySelectorAll('path[stroke-dasharray]')).toHaveLength(1);
    expect(Number(container.querySelectorAll('.fill-ember')[1]?.getAttribute('height'))).toBeGreaterThan(0);
  });
});

describe('the days ahead in a row', () => {
  const span = (likely: number | null, truck: number | null) =>
    render(
      <SpanMini
        label="runs out Thursday"
        now={now}
        early={likely && likely - day}
        likely={likely}
        late={likely && likely + day}
        truck={truck === null ? null : { from: truck, to: truck + day / 12 }}
      />,
    ).container;

  test('running out before the truck is a triangle in ember', () => {
    const drawn = span(now + 2 * day, now + 3 * day);
    expect(drawn.querySelectorAll('path.fill-ember')).toHaveLength(1);
    expect(drawn.querySelectorAll('circle')).toHaveLength(0);
    expect(drawn.querySelectorAll('.fill-kelp')).toHaveLength(1);
  });

  test('running out after the truck, or with no truck set, is a dot', () => {
    for (const truck of [now + day, null]) {
      const drawn = span(now + 3 * day, truck);
      expect(drawn.querySelectorAll('.fill-ember')).toHaveLength(0);
      expect(drawn.querySelectorAll('circle')).toHaveLength(1);
      cleanup();
    }
  });

  test('what lies beyond the seven days is not drawn', () => {
    const drawn = span(now + 9 * day, now + 8 * day);
    expect(drawn.querySelectorAll('circle, rect, .fill-ember, .fill-kelp')).toHaveLength(0);
  });

  test('nothing known leaves the bare days', () => {
    const drawn = span(null, null);
    expect(drawn.querySelectorAll('circle, rect')).toHaveLength(0);
    expect(drawn.querySelectorAll('path.stroke-edge')).toHaveLength(1 + 8);
  });
});
