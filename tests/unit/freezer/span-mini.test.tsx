// @vitest-environment happy-dom
import { cleanup, render } from '@testing-library/react';
import { afterEach, expect, test } from 'vitest';
import { SpanMini } from '../../../src/freezer/span-mini';

afterEach(cleanup);

const day = 86_400_000;
const now = Date.parse('2026-12-01T19:10:00Z');

const span = (likely: number | null, truck: number | null, trouble = false) =>
  render(
    <SpanMini
      label="runs out Thursday"
      now={now}
      early={likely && likely - day}
      likely={likely}
      late={likely && likely + day}
      truck={truck === null ? null : { from: truck }}
      trouble={trouble}
    />,
  ).container;

test('trouble is a triangle in ember', () => {
  const drawn = span(now + 2 * day, now + 3 * day, true);
  expect(drawn.querySelectorAll('path.fill-ember')).toHaveLength(1);
  expect(drawn.querySelectorAll('circle')).toHaveLength(0);
  expect(drawn.querySelectorAll('.fill-kelp')).toHaveLength(1);
});

test('no trouble is a dot, with or without a truck', () => {
  for (const truck of [now + day, null]) {
    const drawn = span(now + 3 * day, truck);
    expect(drawn.querySelectorAll('.fill-ember')).toHaveLength(0);
    expect(drawn.querySelectorAll('circle')).toHaveLength(1);
    cleanup();
  }
});

test('time runs from left to right: the truck a day after the run-out stands right of it', () => {
  const drawn = span(now + 2 * day, now + 3 * day);
  const truckX = Number(/^M([\d.]+)/.exec(drawn.querySelector('.fill-kelp')?.getAttribute('d') ?? '')?.[1]);
  // A seventh of the 140 between the ends.
  expect(truckX - Number(drawn.querySelector('circle')?.getAttribute('cx'))).toBeCloseTo(140 / 7, 5);
});

test('what lies beyond the seven days is not drawn', () => {
  expect(span(now + 9 * day, now + 8 * day).querySelectorAll('circle, rect, .fill-ember, .fill-kelp')).toHaveLength(0);
});

test('nothing known leaves the bare days', () => {
  const drawn = span(null, null);
  expect(drawn.querySelectorAll('circle, rect')).toHaveLength(0);
  expect(drawn.querySelectorAll('path.stroke-edge')).toHaveLength(1 + 8);
});
