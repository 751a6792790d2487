import { useTranslation } from 'react-i18next';
import type { District } from '../../../server/contract/districts';
import { api } from '../../../server/contract/index';
import { queryClient } from '../../api/query';
import { Form } from '../../form/form';
import { SubmitButton } from '../../form/submit-button';
import { TextField } from '../../form/text-field';
import { useContractForm } from '../../form/use-contract-form';
import { useMembership } from '../../lib/me';
import { Dialog } from '../../ui/dialog';
import { districtsQueryOf, districtStale } from './districts-query';
import { newestOf } from './newest-of';

interface Props {
  open: boolean;
  /** Null for a new one. */
  district: District | null;
  onClose: () => void;
  onDone: (words: string) => void;
}

/** A district's name, for a new one or another name for an old one. */
export function DistrictDialog({ open, district, onClose, onDone }: Props) {
  const { t } = useTranslation(['accounts', 'common']);
  const title = district ? t('change.title', { name: district.name }) : t('districts.add');
  return (
    <Dialog open={open} title={title} onClose={onClose} closeLabel={t('common:close')}>
      {district ? <Change district={district} onDone={onDone} /> : <Add onDone={onDone} />}
    </Dialog>
  );
}

function Add({ onDone }: Pick<Props, 'onDone'>) {
  const { t } = useTranslation('accounts');
  const { slug } = useMembership().producer;
  const form = useContractForm(api.districts.create, {
    start: { name: '' },
    input: (body) => ({ params: { producer: slug }, body }),
    stale: districtStale,
    onDone: ({ name }) => onDone(t('added', { name })),
  });
  return (
    <Form form={form}>
      <Name />
      <SubmitButton>{t('add')}</SubmitButton>
    </Form>
  );
}

function Change({ district: { id, name, version }, onDone }: Pick<Props, 'onDone'> & { district: District }) {
  const { t } = useTranslation('accounts');
  const { slug } = useMembership().producer;
  const form = useContractForm(api.districts.change, {
    start: { name, version },
    input: (body) => ({ params: { producer: slug, districtId: id }, body }),
    stale: districtStale,
    onDone: (changed) => onDone(t('saved', { name: changed.name })),
  });
  const newest = async () => {
    const { districts } = await queryClient.fetchQuery({ ...districtsQueryOf(slug), staleTime: 0 });
    const found = newestOf(districts, id);
    return { name: found.name, version: found.version };
  };
  return (
    <Form form={form} meanwhile={{ fields: [{ name: 'name', label: t('districts.name'), said: (theirs) => theirs.name }], onNewest: newest }}>
      <Name />
      <SubmitButton>{t('save')}</SubmitButton>
    </Form>
  );
}

function Name() {
  const { t } = useTranslation('accounts');
  return <TextField name="name" label={t('districts.name')} maxLength={120} autoComplete="off" autoFocus />;
}
