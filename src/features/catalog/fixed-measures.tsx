import { useTranslation } from 'react-i18next';
import type { FreezerModel } from '../../../server/contract/models';
import { Field } from '../../ui/field';
import { Notice } from '../../ui/notice';
import { TextInput } from '../../ui/text-input';
import { modelEnteredOf } from './model-entered';
import { useModelFields } from './use-model-fields';

/** The measures of a model in use, which cannot change, and why. */
export function FixedMeasures({ model }: { model: FreezerModel }) {
  const { t } = useTranslation('catalog');
  const measures = useModelFields().filter(({ name }) => name !== 'name');
  return (
    <>
      <Notice title={t('models.fixed')}>{t('models.fixed-why', { count: model.freezers })}</Notice>
      {measures.map(({ name, label, said }) => (
        <Field key={name} label={label}>
          {(control) => <TextInput {...control} disabled value={said(modelEnteredOf(model))} />}
        </Field>
      ))}
    </>
  );
}
