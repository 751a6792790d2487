import { useId } from 'react';
import { useTranslation } from 'react-i18next';
import { FieldError } from '../../ui/field';
import { CheckGroup } from './check-group';
import type { Places } from './places-query';
import { StorePicker } from './store-picker';
import { useScopes } from './use-scopes';

interface Props {
  places: Places;
  storeNames: ReadonlyMap<string, string>;
  onNamed: (storeId: string, name: string) => void;
}

/** What somebody is assigned: whole districts, whole accounts and single stores, together. */
export function AssignmentFields({ places: { districts, accounts }, storeNames, onNamed }: Props) {
  const { t } = useTranslation('people');
  const id = useId();
  const { fault, chosen, toggle } = useScopes();
  return (
    <fieldset className="grid gap-5" aria-describedby={fault ? `${id}-error ${id}-hint` : `${id}-hint`}>
      <legend className="font-semibold">{t('assigned.title')}</legend>
      <p id={`${id}-hint`} className="text-body text-ink-3">
        {t('assigned.hint')}
      </p>
      {fault && <FieldError id={`${id}-error`}>{fault}</FieldError>}
      <CheckGroup
        legend={t('assigned.districts')}
        none={t('assigned.no-districts')}
        items={districts}
        chosen={chosen('district')}
        onToggle={(districtId) => toggle('district', districtId)}
      />
      <CheckGroup
        legend={t('assigned.accounts')}
        none={t('assigned.no-accounts')}
        items={accounts.map(({ id: accountId, number, name }) => ({ id: accountId, name, detail: number }))}
        chosen={chosen('account')}
        onToggle={(accountId) => toggle('account', accountId)}
      />
      <StorePicker chosen={chosen('store')} names={storeNames} onNamed={onNamed} onToggle={(storeId) => toggle('store', storeId)} />
    </fieldset>
  );
}
