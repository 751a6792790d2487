// @vitest-environment happy-dom
import { cleanup, fireEvent, render, screen } from '@testing-library/react';
import i18next from 'i18next';
import { initReactI18next } from 'react-i18next';
import { afterEach, beforeAll, expect, test } from 'vitest';
import common from '../../../locales/en/common.json';
import { MovedNote } from '../../../src/table/moved-note';
import { useSteadyRows } from '../../../src/table/use-steady-rows';

beforeAll(async () => {
  await i18next.use(initReactI18next).init({ lng: 'en', defaultNS: 'common', resources: { en: { common } } });
});
afterEach(cleanup);

function List({ rows }: { rows: { id: string }[] }) {
  const steady = useSteadyRows(rows, 'all');
  return (
    <>
      <ul>
        {steady.rows.map(({ id }) => (
          <li key={id}>{id}</li>
        ))}
      </ul>
      <MovedNote moved={steady.moved} showNewest={steady.showNewest} />
    </>
  );
}

const shown = () => screen.getAllByRole('listitem').map((item) => item.textContent);
const [a, b] = [{ id: 'a' }, { id: 'b' }];

test('a list that would stand otherwise says so, and stands so when asked; who asked is not lost', () => {
  const { rerender } = render(<List rows={[a, b]} />);
  expect(screen.getByRole('status').textContent).toBe('');
  rerender(<List rows={[{ id: 'new' }, a, b]} />);
  expect(shown()).toEqual(['a', 'b']);
  expect(screen.getByRole('status').textContent).toBe('The list has changed. Show the newest');
  fireEvent.click(screen.getByText('Show the newest'));
  expect(shown()).toEqual(['new', 'a', 'b']);
  expect(screen.getByRole('status').textContent).toBe('');
  expect(document.activeElement).toBe(screen.getByRole('status'));
});
