import { useFormContext, useWatch } from 'react-hook-form';
import { useTranslation } from 'react-i18next';
import type { Grant } from '../../../server/contract/words';
import { CheckGroup } from './check-group';

interface Values {
  grants: Grant[];
}

/** What somebody may do beyond their role. */
export function GrantFields({ offered }: { offered: Grant[] }) {
  const { t } = useTranslation('people');
  const { setValue } = useFormContext<Values>();
  const ticked = useWatch<Values, 'grants'>({ name: 'grants' });
  const toggle = (id: string) =>
    setValue('grants', offered.filter((grant) => (grant === id ? !ticked.includes(grant) : ticked.includes(grant))), { shouldDirty: true });
  return (
    <CheckGroup
      legend={t('grants.legend')}
      items={offered.map((grant) => ({ id: grant, name: t(`grants.${grant}`), detail: t(`grants.${grant}-hint`) }))}
      chosen={ticked}
      onToggle={toggle}
    />
  );
}
