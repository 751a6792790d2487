import { useState } from 'react';
import { useFormContext, useWatch } from 'react-hook-form';
import { useTranslation } from 'react-i18next';
import { api } from '../../../server/contract/index';
import type { TelemetryKey } from '../../../server/contract/sensors';
import { Form } from '../../form/form';
import { SubmitButton } from '../../form/submit-button';
import { TextField } from '../../form/text-field';
import { useContractForm } from '../../form/use-contract-form';
import { useMembership } from '../../lib/me';
import { ChoiceCards } from '../../ui/choice-cards';
import { Dialog } from '../../ui/dialog';
import { KeyShown } from './key-shown';

interface Props {
  open: boolean;
  /** The key the new one takes over from. */
  replaced: TelemetryKey | null;
  onClose: () => void;
}

/** Asks for a name, makes the key and shows it this once. */
export function NewKey({ open, replaced, onClose }: Props) {
  const { t } = useTranslation(['sensors', 'common']);
  const [secret, setSecret] = useState<string | null>(null);
  const close = () => {
    setSecret(null);
    onClose();
  };
  const asking = replaced ? t('keys.replace.title', { name: replaced.name }) : t('keys.create');
  return (
    <Dialog open={open} title={secret ? t('keys.shown.title') : asking} onClose={close} closeLabel={t('common:close')}>
      {secret ? <KeyShown secret={secret} onDone={close} /> : <KeyForm replaced={replaced} onMade={setSecret} />}
    </Dialog>
  );
}

interface FormProps {
  replaced: TelemetryKey | null;
  onMade: (secret: string) => void;
}

function KeyForm({ replaced, onMade }: FormProps) {
  const { t } = useTranslation('sensors');
  const { slug } = useMembership().producer;
  const form = useContractForm(api.sensors.createKey, {
    start: { name: replaced?.name ?? '', replaces: replaced?.id ?? null, overlapHours: 48 },
    input: (body) => ({ params: { producer: slug }, body }),
    stale: [api.sensors.listKeys],
    onDone: ({ secret }) => onMade(secret),
  });
  return (
    <Form form={form}>
      <TextField name="name" label={t('keys.name')} hint={t('keys.name-hint')} maxLength={80} autoComplete="off" />
      {replaced && <Overlap />}
      <SubmitButton>{replaced ? t('keys.replace.yes') : t('keys.create-yes')}</SubmitButton>
    </Form>
  );
}

interface Values {
  overlapHours: number;
}

/** How long the old key still opens the door. */
function Overlap() {
  const { t } = useTranslation('sensors');
  const { setValue } = useFormContext<Values>();
  const hours = useWatch<Values, 'overlapHours'>({ name: 'overlapHours' });
  const choices = overlaps.map((value) => ({ value, title: t(`keys.overlap.${value}`) }));
  return (
    <ChoiceCards
      legend={t('keys.overlap.legend')}
      hint={t('keys.overlap.hint')}
      name="overlapHours"
      choices={choices}
      value={overlaps.find((value) => Number(value) === hours) ?? null}
      onChange={(value) => setValue('overlapHours', Number(value), { shouldDirty: true })}
    />
  );
}

/** In hours. */
const overlaps = ['1', '48', '168'] as const;
