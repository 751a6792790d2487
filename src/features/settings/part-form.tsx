import { useState, type ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import { api } from '../../../server/contract/index';
import type { Settings } from '../../../server/contract/settings';
import { call } from '../../api/call';
import type { NamedField } from '../../form/changed-meanwhile';
import { Form } from '../../form/form';
import { SubmitButton } from '../../form/submit-button';
import { useContractForm } from '../../form/use-contract-form';
import { useMembership } from '../../lib/me';

export interface PartProps {
  settings: Settings;
  onSaved: (settings: Settings) => void;
}

type Entered = Omit<Settings, 'hasLogo' | 'version'>;

interface Props<P extends Partial<Entered>> extends PartProps {
  part: (whole: Settings) => P;
  fields: NamedField<P>[];
  children: ReactNode;
}

/** The form of some of the settings: sends these and no others. */
export function PartForm<P extends Partial<Entered>>({ settings, onSaved, part, fields, children }: Props<P>) {
  const { t } = useTranslation('settings');
  const { slug } = useMembership().producer;
  const [saved, setSaved] = useState(false);
  const params = { producer: slug };
  const partOf = (whole: Settings) => ({ version: whole.version, ...part(whole) });
  const form = useContractForm(api.settings.change, {
    start: partOf(settings),
    values: partOf(settings),
    input: (body) => ({ params, body }),
    // Every page speaks by the producer's name, clock and hours.
    stale: [api.settings.read, api.me.read],
    onDone: (result) => {
      onSaved(result);
      setSaved(true);
    },
  });
  const onNewest = async () => partOf(await call(api.settings.read, { params }));
  const done = saved && !form.fields.formState.isDirty ? t('saved') : undefined;
  return (
    <Form form={form} meanwhile={{ fields, onNewest }} done={done}>
      {children}
      <SubmitButton>{t('save')}</SubmitButton>
    </Form>
  );
}
