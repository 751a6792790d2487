// @vitest-environment happy-dom
import { QueryClientProvider } from '@tanstack/react-query';
import { cleanup, fireEvent, render, screen, waitFor } from '@testing-library/react';
import i18next from 'i18next';
import { useFieldArray } from 'react-hook-form';
import { initReactI18next } from 'react-i18next';
import { afterEach, beforeAll, expect, test, vi } from 'vitest';
import common from '../../../locales/en/common.json';
import problems from '../../../locales/en/problems.json';
import { api } from '../../../server/contract/index';
import { Problem } from '../../../src/api/call';
import { queryClient } from '../../../src/api/query';
import type { NamedField } from '../../../src/form/changed-meanwhile';
import { Form } from '../../../src/form/form';
import { SubmitButton } from '../../../src/form/submit-button';
import { TextField } from '../../../src/form/text-field';
import { useContractForm } from '../../../src/form/use-contract-form';

beforeAll(async () => {
  await i18next.use(initReactI18next).init({ lng: 'en', defaultNS: 'common', resources: { en: { common, problems, validation: {} } }, interpolation: { escapeValue: false } });
});
afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

const start = { version: 3, name: 'Lantern Group', terms: 'Net 30', contacts: [{ name: 'Ana', work: '', email: '', phone: '' }] };
type Entered = typeof start;

function Contacts() {
  const { fields } = useFieldArray<Entered, 'contacts'>({ name: 'contacts' });
  return fields.map(({ id }, i) => <TextField key={id} name={`contacts.${i}.name`} label={`Contact ${i + 1}`} />);
}

function Page({ onNewest }: { onNewest: () => Promise<Entered> }) {
  const form = useContractForm(api.accounts.change, { start, input: (body) => ({ params: { producer: 'p', accountId: 'a' }, body }), stale: [] });
  const fields: NamedField<Entered>[] = [
    { name: 'name', label: 'Name' },
    { name: 'terms', label: 'Terms', said: ({ terms }) => terms },
    { name: 'contacts', label: 'Contacts' },
  ];
  return (
    <Form form={form} meanwhile={{ fields, onNewest }}>
      <TextField name="name" label="Name" />
      <TextField name="terms" label="Terms" />
      <Contacts />
      <SubmitButton>Save</SubmitButton>
    </Form>
  );
}

/** Answers each sending with the next of these, and keeps what was sent. */
function server(...answers: Response[]) {
  const sent: unknown[] = [];
  vi.stubGlobal('fetch', (_url: string, { body }: { body: string }) => {
    sent.push(JSON.parse(body));
    return Promise.resolve(answers.shift());
  });
  return sent;
}

const refused = () => Response.json({ type: 'urn:nilas:problem:changed-meanwhile', title: '', detail: '', status: 409 }, { status: 409 });
const open = (onNewest: () => Promise<Entered>) =>
  render(
    <QueryClientProvider client={queryClient}>
      <Page onNewest={onNewest} />
    </QueryClientProvider>,
  );
const box = (label: string) => screen.getByLabelText<HTMLInputElement>(label);
const type = (label: string, value: string) => fireEvent.input(box(label), { target: { value } });
const send = () => fireEvent.click(screen.getByText('Save'));
const somebodyElse = 'Somebody else changed this in the meantime';
const getNewest = async () => fireEvent.click(await screen.findByText('Get the newest version'));

test('what was typed stays, the rest is the other person’s, and the second sending carries their version', async () => {
  const sent = server(refused(), Response.json({}));
  open(() => Promise.resolve({ ...start, version: 4, name: 'Lantern', terms: 'Net 15', contacts: [{ name: 'Ana', work: '', email: '', phone: '' }, { name: 'Luis', work: '', email: '', phone: '' }] }));
  type('Name', 'Lantern Corner Group');
  expect(screen.queryByText('Get the newest version')).toBeNull();
  send();
  expect(await screen.findAllByText(somebodyElse)).toHaveLength(1);
  await getNewest();

  const notice = await screen.findByText('You have the newest version now. Save again to keep what you typed.');
  expect(notice.parentElement?.parentElement?.parentElement).toBe(document.activeElement);
  expect(screen.queryByText(somebodyElse)).toBeNull();
  expect(screen.getAllByRole('listitem').map((item) => item.textContent)).toEqual(['Name (what you typed is kept)', 'Terms: Net 15', 'Contacts']);
  expect([box('Name').value, box('Terms').value, box('Contact 2').value]).toEqual(['Lantern Corner Group', 'Net 15', 'Luis']);

  send();
  await waitFor(() => expect(sent).toHaveLength(2));
  expect(sent).toMatchObject([
    { version: 3, name: 'Lantern Corner Group', terms: 'Net 30' },
    { version: 4, name: 'Lantern Corner Group', terms: 'Net 15', contacts: [{ name: 'Ana' }, { name: 'Luis' }] },
  ]);
});

test('a list that was touched is kept whole', async () => {
  const sent = server(refused(), Response.json({}));
  open(() => Promise.resolve({ ...start, version: 9, contacts: [] }));
  type('Contact 1', 'Ana María');
  send();
  await getNewest();
  expect(await screen.findByText('Contacts (what you typed is kept)')).toBeTruthy();
  expect(box('Contact 1').value).toBe('Ana María');
  send();
  await waitFor(() => expect(sent).toHaveLength(2));
  expect(sent[1]).toMatchObject({ version: 9, contacts: [{ name: 'Ana María' }] });
});

test('says so when the other person changed nothing of the form, and when the newest cannot be had', async () => {
  server(refused());
  const onNewest = vi.fn<() => Promise<Entered>>().mockRejectedValueOnce(new Problem('offline', 0)).mockResolvedValue({ ...start, version: 4 });
  open(onNewest);
  type('Name', 'Lantern');
  send();
  await getNewest();
  expect(await screen.findByText('No connection')).toBeTruthy();
  await getNewest();
  expect(await screen.findByText('Nothing in this form was changed by the other person.')).toBeTruthy();
  expect(box('Name').value).toBe('Lantern');
});
