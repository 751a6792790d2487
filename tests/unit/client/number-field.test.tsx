// @vitest-environment happy-dom
import { QueryClientProvider } from '@tanstack/react-query';
import { cleanup, fireEvent, render, screen, waitFor } from '@testing-library/react';
import i18next from 'i18next';
import { initReactI18next } from 'react-i18next';
import { afterEach, beforeAll, expect, test, vi } from 'vitest';
import common from '../../../locales/en/common.json';
import validation from '../../../locales/en/validation.json';
import { api } from '../../../server/contract/index';
import { queryClient } from '../../../src/api/query';
import { Form } from '../../../src/form/form';
import { NumberField } from '../../../src/form/number-field';
import { SubmitButton } from '../../../src/form/submit-button';
import { TextField } from '../../../src/form/text-field';
import { useContractForm } from '../../../src/form/use-contract-form';

beforeAll(async () => {
  await i18next.use(initReactI18next).init({ lng: 'en', defaultNS: 'common', resources: { en: { common, validation } }, interpolation: { escapeValue: false } });
});
afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

function Page() {
  const form = useContractForm(api.products.create, { start: { name: '7 lb', gtin: '' }, input: (body) => ({ params: { producer: 'p' }, body }), stale: [] });
  return (
    <Form form={form}>
      <NumberField name="bagPounds" label="Pounds" />
      <TextField name="gtin" label="GTIN" />
      <SubmitButton>Add</SubmitButton>
    </Form>
  );
}

const measure = 'Enter a number that is possible here.';
const box = (label: string) => screen.getByLabelText<HTMLInputElement>(label);
const sendWith = (label: string, value: string) => {
  fireEvent.input(box(label), { target: { value } });
  fireEvent.click(screen.getByText('Add'));
};

test('what is no number, none or out of measure is said at the field and stays as it was typed; a number is sent as one', async () => {
  const sent: unknown[] = [];
  vi.stubGlobal('fetch', (_url: string, { body }: { body: string }) => {
    sent.push(JSON.parse(body));
    return Promise.resolve(Response.json({}));
  });
  render(
    <QueryClientProvider client={queryClient}>
      <Page />
    </QueryClientProvider>,
  );
  for (const wrong of ['seven', '', '101']) {
    sendWith('Pounds', wrong);
    expect(await screen.findByText(measure), wrong).toBeTruthy();
    expect(box('Pounds').value).toBe(wrong);
    fireEvent.input(box('Pounds'), { target: { value: '7' } });
    await waitFor(() => expect(screen.queryByText(measure)).toBeNull());
  }
  // The last digit is not the check digit.
  sendWith('GTIN', '9524170000078');
  expect(await screen.findByText(/^Enter a GTIN/)).toBeTruthy();
  expect(sent).toEqual([]);

  fireEvent.input(box('Pounds'), { target: { value: '6.5' } });
  sendWith('GTIN', '9524 1700 00079');
  await waitFor(() => expect(sent).toEqual([{ name: '7 lb', bagPounds: 6.5, gtin: '9524170000079' }]));
});
