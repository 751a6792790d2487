// @vitest-environment happy-dom
import { act, cleanup, renderHook } from '@testing-library/react';
import { afterEach, describe, expect, test } from 'vitest';
import { useSteadyRows } from '../../../src/table/use-steady-rows';

afterEach(cleanup);

const row = (id: string, pounds = 100) => ({ id, pounds });
const watch = (...rows: ReturnType<typeof row>[]) =>
  renderHook(({ rows, list }) => useSteadyRows(rows, list), { initialProps: { rows, list: 'all' } });
type Watched = ReturnType<typeof watch>['result'];
const shown = ({ current }: Watched) => current.rows.map(({ id, pounds }) => `${id} ${pounds}`);

describe('a list that asks again by itself', () => {
  test('changes its cells in place, and says nothing while the order is the same', () => {
    const { result, rerender } = watch(row('a'), row('b'));
    rerender({ rows: [row('a', 90), row('b', 80)], list: 'all' });
    expect(shown(result)).toEqual(['a 90', 'b 80']);
    expect(result.current.moved).toBe(false);
  });

  test('keeps its order when the rows would change places, until the reader asks', () => {
    const { result, rerender } = watch(row('a'), row('b'));
    rerender({ rows: [row('b', 10), row('a', 90)], list: 'all' });
    expect(shown(result)).toEqual(['a 90', 'b 10']);
    expect(result.current.moved).toBe(true);
    act(() => result.current.showNewest());
    expect(shown(result)).toEqual(['b 10', 'a 90']);
    expect(result.current.moved).toBe(false);
  });

  test('holds back a row that appears', () => {
    const { result, rerender } = watch(row('a'), row('b'));
    rerender({ rows: [row('new'), row('a'), row('b')], list: 'all' });
    expect(shown(result)).toEqual(['a 100', 'b 100']);
    expect(result.current.moved).toBe(true);
  });

  test('leaves a row that went in its place, as it last was, over any number of answers', () => {
    const { result, rerender } = watch(row('a'), row('b'), row('c'));
    rerender({ rows: [row('a'), row('b', 55), row('c')], list: 'all' });
    rerender({ rows: [row('a'), row('c')], list: 'all' });
    rerender({ rows: [row('a', 1), row('c', 3)], list: 'all' });
    expect(shown(result)).toEqual(['a 1', 'b 55', 'c 3']);
    expect(result.current.moved).toBe(true);
  });

  test('comes to rest by itself when the order is again as shown', () => {
    const { result, rerender } = watch(row('a'), row('b'));
    rerender({ rows: [row('b'), row('a')], list: 'all' });
    rerender({ rows: [row('a'), row('b')], list: 'all' });
    expect(result.current.moved).toBe(false);
  });

  test('shows the first rows of a list that was empty at once', () => {
    const { result, rerender } = watch();
    rerender({ rows: [row('a')], list: 'all' });
    expect(shown(result)).toEqual(['a 100']);
    expect(result.current.moved).toBe(false);
  });
});

test('another filter or page is another list, shown in its own order', () => {
  const { result, rerender } = watch(row('a'), row('b'));
  rerender({ rows: [row('b'), row('c'), row('a')], list: 'warm' });
  expect(shown(result)).toEqual(['b 100', 'c 100', 'a 100']);
  expect(result.current.moved).toBe(false);
});
