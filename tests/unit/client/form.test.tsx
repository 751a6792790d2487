// @vitest-environment happy-dom
import { QueryClientProvider } from '@tanstack/react-query';
import { cleanup, fireEvent, render, screen } from '@testing-library/react';
import i18next from 'i18next';
import { initReactI18next } from 'react-i18next';
import { afterEach, beforeAll, expect, test, vi } from 'vitest';
import common from '../../../locales/en/common.json';
import problems from '../../../locales/en/problems.json';
import { api } from '../../../server/contract/index';
import { queryClient } from '../../../src/api/query';
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

const contact = { name: 'Ana', work: '', email: '', phone: '' };

/** Its fields stand in another order than the body's, which is `number`, `name`, `terms`, `contacts`. */
function Page() {
  const form = useContractForm(api.accounts.create, {
    start: { number: '1', name: 'Lantern', terms: '', language: 'en', contacts: [contact] },
    input: (body) => ({ params: { producer: 'p' }, body }),
    stale: [],
  });
  return (
    <Form form={form}>
      <TextField name="contacts.0.name" label="Contact" />
      <TextField name="terms" label="Terms" />
      <TextField name="number" label="Number" />
      <TextField name="name" label="Name" />
      <SubmitButton>Save</SubmitButton>
    </Form>
  );
}

const open = () =>
  render(
    <QueryClientProvider client={queryClient}>
      <Page />
    </QueryClientProvider>,
  );
const empty = (label: string) => fireEvent.input(screen.getByLabelText(label), { target: { value: '' } });
const send = () => fireEvent.click(screen.getByText('Save'));
const listed = async () => {
  await screen.findByText('3 fields need another look');
  return screen.getAllByRole('listitem').map((item) => item.textContent?.split(':')[0]);
};

test('what is wrong is listed in the order in which the fields stand', async () => {
  open();
  ['Number', 'Name', 'Contact'].forEach(empty);
  send();
  expect(await listed()).toEqual(['Contact', 'Number', 'Name']);
  const [first] = screen.getAllByRole('listitem');
  fireEvent.click(first?.querySelector('button') ?? document.body);
  expect(document.activeElement).toBe(screen.getByLabelText('Contact'));
});

test('so is what the server finds wrong, and what is at no field comes last', async () => {
  const errors = ['/language', '/name', '/terms'].map((pointer) => ({ pointer, fault: 'taken' }));
  vi.stubGlobal('fetch', () => Promise.resolve(Response.json({ type: 'urn:nilas:problem:bad-input', title: '', detail: '', status: 422, errors }, { status: 422 })));
  open();
  send();
  expect(await listed()).toEqual(['Terms', 'Name', 'invalid']);
});

test('a refusal that is at no field is brought to whoever pressed the button, each time', async () => {
  const refusal = { type: 'urn:nilas:problem:not-allowed', title: '', detail: '', status: 403, errors: [] };
  vi.stubGlobal('fetch', () => Promise.resolve(Response.json(refusal, { status: 403 })));
  open();
  for (let tries = 0; tries < 2; tries += 1) {
    screen.getByText('Save').focus();
    send();
    await vi.waitFor(() => expect(document.activeElement?.contains(screen.getByRole('alert'))).toBe(true));
    expect(document.activeElement?.contains(screen.getByText('Save'))).toBe(false);
  }
});
