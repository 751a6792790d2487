import { useTranslation } from 'react-i18next';
import { api } from '../../../server/contract/index';
import type { FreezerModel } from '../../../server/contract/models';
import { queryClient } from '../../api/query';
import { Form } from '../../form/form';
import { SubmitButton } from '../../form/submit-button';
import { TextField } from '../../form/text-field';
import { useContractForm } from '../../form/use-contract-form';
import { useMembership } from '../../lib/me';
import { Dialog } from '../../ui/dialog';
import { newestOf } from '../accounts/newest-of';
import { modelsQueryOf, modelStale } from './catalog-queries';
import { FixedMeasures } from './fixed-measures';
import { MeasureFields } from './measure-fields';
import { modelEnteredOf } from './model-entered';
import { useModelFields } from './use-model-fields';

interface Props {
  open: boolean;
  /** Null for a new one. */
  model: FreezerModel | null;
  onClose: () => void;
  onDone: (words: string) => void;
}

export function ModelDialog({ open, model, onClose, onDone }: Props) {
  const { t } = useTranslation(['catalog', 'accounts', 'common']);
  const title = model ? t('accounts:change.title', { name: model.name }) : t('models.add');
  return (
    <Dialog open={open} title={title} onClose={onClose} closeLabel={t('common:close')}>
      {model ? <Change model={model} onDone={onDone} /> : <Add onDone={onDone} />}
    </Dialog>
  );
}

function Add({ onDone }: Pick<Props, 'onDone'>) {
  const { t } = useTranslation('accounts');
  const { slug } = useMembership().producer;
  const form = useContractForm(api.models.create, {
    start: { name: '' },
    input: (body) => ({ params: { producer: slug }, body }),
    stale: modelStale,
    onDone: ({ name }) => onDone(t('added', { name })),
  });
  return (
    <Form form={form}>
      <Name />
      <MeasureFields />
      <SubmitButton>{t('add')}</SubmitButton>
    </Form>
  );
}

function Change({ model, onDone }: Pick<Props, 'onDone'> & { model: FreezerModel }) {
  const { t } = useTranslation('accounts');
  const { slug } = useMembership().producer;
  const form = useContractForm(api.models.change, {
    start: modelEnteredOf(model),
    input: (body) => ({ params: { producer: slug, modelId: model.id }, body }),
    stale: modelStale,
    onDone: ({ name }) => onDone(t('saved', { name })),
  });
  const newest = async () => modelEnteredOf(newestOf((await queryClient.fetchQuery({ ...modelsQueryOf(slug), staleTime: 0 })).models, model.id));
  return (
    <Form form={form} meanwhile={{ fields: useModelFields(), onNewest: newest }}>
      <Name />
      {model.freezers > 0 ? <FixedMeasures model={model} /> : <MeasureFields />}
      <SubmitButton>{t('save')}</SubmitButton>
    </Form>
  );
}

function Name() {
  const { t } = useTranslation('catalog');
  return <TextField name="name" label={t('name')} maxLength={80} autoComplete="off" autoFocus />;
}
