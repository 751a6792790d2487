// @vitest-environment happy-dom
import { cleanup, fireEvent, render, screen } from '@testing-library/react';
import { useState } from 'react';
import { afterEach, expect, test, vi } from 'vitest';
import { Button } from '../../../src/ui/button';
import { Dialog } from '../../../src/ui/dialog';
import { Field } from '../../../src/ui/field';
import { TextInput } from '../../../src/ui/text-input';

afterEach(cleanup);

test('a field ties label, hint and error to its control', () => {
  render(
    <Field label="E-mail" hint="Where the link goes" error="No such address">
      {(control) => <TextInput {...control} />}
    </Field>,
  );
  const input = screen.getByLabelText('E-mail');
  const described = (input.getAttribute('aria-describedby') ?? '').split(' ').map((id) => document.getElementById(id)?.textContent);
  expect(described).toEqual(['No such address', 'Where the link goes']);
  expect(input.getAttribute('aria-invalid')).toBe('true');
});

test('a field without hint or error is described by nothing', () => {
  render(<Field label="Name">{(control) => <TextInput {...control} />}</Field>);
  expect(screen.getByLabelText('Name').hasAttribute('aria-describedby')).toBe(false);
});

function Asking() {
  const [open, setOpen] = useState(false);
  return (
    <>
      <Button onClick={() => setOpen(true)}>Take back</Button>
      <Dialog open={open} title="Take it back?" closeLabel="Close" onClose={() => setOpen(false)}>
        <p>It will not be fixed.</p>
      </Dialog>
    </>
  );
}

test('a dialog is named, and gives focus back when its cross is pressed', () => {
  render(<Asking />);
  const opener = screen.getByText('Take back');
  opener.focus();
  fireEvent.click(opener);
  const dialog = screen.getByRole('dialog');
  expect(document.getElementById(dialog.getAttribute('aria-labelledby') ?? '')?.textContent).toBe('Take it back?');
  expect((dialog as HTMLDialogElement).open).toBe(true);
  screen.getByLabelText('Close').focus();
  fireEvent.click(screen.getByLabelText('Close'));
  expect(document.querySelector('dialog')?.open).toBe(false);
  expect(document.activeElement).toBe(opener);
});

test('Esc asks the owner to close', () => {
  const onClose = vi.fn();
  render(
    <Dialog open title="Keys" onClose={onClose}>
      <p>Words</p>
    </Dialog>,
  );
  fireEvent(screen.getByRole('dialog'), new Event('cancel', { cancelable: true }));
  expect(onClose).toHaveBeenCalledOnce();
});

test('a busy button keeps its place and takes no second press', () => {
  const send = vi.fn();
  render(
    <Button busy onClick={send}>
      Send
    </Button>,
  );
  const button = screen.getByText('Send');
  fireEvent.click(button);
  expect(send).not.toHaveBeenCalled();
  expect(button.getAttribute('aria-busy')).toBe('true');
  expect(button.hasAttribute('disabled')).toBe(false);
});
