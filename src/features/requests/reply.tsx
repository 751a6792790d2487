import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { api } from '../../../server/contract/index';
import type { Request } from '../../../server/contract/requests';
import { Form } from '../../form/form';
import { SubmitButton } from '../../form/submit-button';
import { TextField } from '../../form/text-field';
import { useContractForm } from '../../form/use-contract-form';
import { useMembership } from '../../lib/me';
import { Button } from '../../ui/button';

const stale = [api.requests.read, api.requests.list, api.stores.read];

/** Words for the other side; the label says in which language the store reads them. */
export function ReplyForm({ request }: { request: Request }) {
  const { t } = useTranslation('requests');
  const { producer, side } = useMembership();
  const [sent, setSent] = useState(false);
  const form = useContractForm(api.requests.reply, {
    start: { words: '' },
    input: (body) => ({ params: { producer: producer.slug, requestId: request.id }, body }),
    stale,
    onDone: () => setSent(true),
  });
  const store = side === 'store';
  return (
    <Form form={form} className="mt-5" done={sent ? t('reply.sent') : undefined}>
      <TextField
        lines={4}
        name="words"
        label={store ? t('reply.store') : t(`reply.${request.language}`)}
        hint={store ? t('reply.hint-store') : t('reply.hint')}
        lang={store ? undefined : request.language}
      />
      <SubmitButton>{t('reply.send')}</SubmitButton>
    </Form>
  );
}

/** A note to staff, kept apart from the reply so that nobody sends one for the other. */
export function NoteForm({ request }: { request: Request }) {
  const { t } = useTranslation('requests');
  const { producer } = useMembership();
  const [open, setOpen] = useState(false);
  const [sent, setSent] = useState(false);
  const form = useContractForm(api.requests.note, {
    start: { words: '' },
    input: (body) => ({ params: { producer: producer.slug, requestId: request.id }, body }),
    stale,
    onDone: () => {
      setOpen(false);
      setSent(true);
    },
  });
  if (!open) {
    return (
      <div className="mt-4">
        <Button variant="quiet" onClick={() => setOpen(true)}>
          {t('note.label')}
        </Button>
        <p role="status" className="mt-2 text-ink-2 empty:hidden">
          {sent && t('note.sent')}
        </p>
      </div>
    );
  }
  return (
    <Form form={form} className="mt-5 rounded-card bg-straw-tint p-4">
      <TextField lines={3} name="words" label={t('note.label')} hint={t('note.hint')} autoFocus />
      <SubmitButton>{t('note.send')}</SubmitButton>
    </Form>
  );
}
