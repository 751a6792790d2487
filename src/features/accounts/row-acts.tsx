import type { ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import type { Retirable } from '../../form/retire-dialog';
import { Button } from '../../ui/button';
import type { ListAct } from './use-list-act';

interface Props {
  of: Retirable;
  onAct: ListAct['start'];
  /** Where else the row leads. */
  children?: ReactNode;
}

/** What can be done about one row of a list, by those who may. */
export function RowActs({ of: { id, name, retired }, onAct, children }: Props) {
  const { t } = useTranslation(['accounts', 'common']);
  return (
    <span className="flex flex-wrap gap-2">
      {!retired && (
        <Button variant="quiet" label={t('change.of', { name })} onClick={() => onAct({ kind: 'change', id })}>
          {t('change.button')}
        </Button>
      )}
      <Button variant="quiet" label={retired ? t('common:restore.of', { name }) : t('common:retire.of', { name })} onClick={() => onAct({ kind: 'retire', id })}>
        {retired ? t('common:restore.button') : t('common:retire.button')}
      </Button>
      {children}
    </span>
  );
}
