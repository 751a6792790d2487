// @vitest-environment happy-dom
import { QueryClientProvider } from '@tanstack/react-query';
import { cleanup, fireEvent, render, screen, waitFor } from '@testing-library/react';
import i18next from 'i18next';
import { useState } from 'react';
import { initReactI18next } from 'react-i18next';
import { afterEach, beforeAll, expect, test, vi } from 'vitest';
import common from '../../../locales/en/common.json';
import problems from '../../../locales/en/problems.json';
import { api } from '../../../server/contract/index';
import { Problem } from '../../../src/api/call';
import { queryClient } from '../../../src/api/query';
import { RetireDialog } from '../../../src/form/retire-dialog';

beforeAll(async () => {
  await i18next.use(initReactI18next).init({ lng: 'en', defaultNS: 'common', resources: { en: { common, problems } }, interpolation: { escapeValue: false } });
});
afterEach(cleanup);

const lakeside = { id: 'a', name: 'Lakeside', retired: false, version: 3 };
type Send = (id: string, body: { version: number; retired: boolean }) => Promise<unknown>;

interface Around {
  send: Send;
  /** How the thing stands once a sending has ended, well or not. */
  after: typeof lakeside;
  needed?: string;
}

function Page({ send, after, needed }: Around) {
  const [thing, setThing] = useState(lakeside);
  const [open, setOpen] = useState(true);
  const [said, setSaid] = useState('');
  return (
    <QueryClientProvider client={queryClient}>
      {open && (
        <RetireDialog
          thing={thing}
          words={{ retire: 'It leaves the list.', restore: 'It is back in the list.' }}
          needed={needed}
          send={async (id, body) => {
            try {
              return await send(id, body);
            } finally {
              setThing(after);
              // The list is drawn anew before the sending counts as done, as it is with an awaited refresh.
              await new Promise((drawn) => setTimeout(drawn, 20));
            }
          }}
          source={api.districts.list}
          onClose={() => setOpen(false)}
          onDone={setSaid}
        />
      )}
      <output>{said}</output>
    </QueryClientProvider>
  );
}

test('says what was asked for, though the list has it retired already', async () => {
  const send = vi.fn<Send>().mockResolvedValue(undefined);
  render(<Page send={send} after={{ ...lakeside, retired: true, version: 4 }} />);
  expect(screen.getByText('It leaves the list.')).toBeTruthy();
  fireEvent.click(screen.getByRole('button', { name: 'Retire', hidden: true }));
  await waitFor(() => expect(document.querySelector('output')?.textContent).toBe('Retired: Lakeside.'));
  expect(send.mock.calls).toEqual([['a', { version: 3, retired: true }]]);
  expect(document.querySelector('dialog')).toBeNull();
});

test('a second press after somebody else was faster carries the newest version', async () => {
  const send = vi.fn<Send>().mockRejectedValueOnce(new Problem('changed-meanwhile', 409)).mockResolvedValue(undefined);
  render(<Page send={send} after={{ ...lakeside, version: 8 }} />);
  const press = () => fireEvent.click(screen.getByRole('button', { name: 'Retire', hidden: true }));
  press();
  expect(await screen.findByText('Somebody else changed this in the meantime')).toBeTruthy();
  press();
  await waitFor(() => expect(send.mock.calls.map(([, { version }]) => version)).toEqual([3, 8]));
});

test('what is known to stay in use cannot be sent away', () => {
  render(<Page send={vi.fn<Send>()} after={lakeside} needed="20 stores are still in use." />);
  expect(screen.getByText('20 stores are still in use.')).toBeTruthy();
  expect(screen.queryByRole('button', { name: 'Retire', hidden: true })).toBeNull();
});
