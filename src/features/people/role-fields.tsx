import { useState } from 'react';
import { useFormContext, useWatch } from 'react-hook-form';
import { useTranslation } from 'react-i18next';
import type { MemberOf } from '../../../server/contract/people';
import { roles, sides, type Role, type Side } from '../../../server/contract/words';
import { SelectField } from '../../form/select-field';
import { ChoiceCards } from '../../ui/choice-cards';
import { AssignmentFields } from './assignment-fields';
import { GrantFields } from './grant-fields';
import { grantsOf } from './grants';
import type { Places } from './places-query';
import { isScoped } from './scoped';

interface Values {
  role?: Role;
  side: Side;
}

interface Props {
  places: Places;
  /** Somebody who has a role already keeps it unless another is chosen. */
  now?: MemberOf;
}

/** The role, and what only some roles are asked: whose side, which stores, and what beyond the role. */
export function RoleFields({ places, now }: Props) {
  const { t } = useTranslation(['people', 'common']);
  const chosen = useWatch<Values, 'role'>({ name: 'role' });
  // Kept here, so that a look at another role forgets no name.
  const [storeNames, setStoreNames] = useState(() => storesOf(now));
  const role = chosen || now?.role;
  const options = roles.filter((known) => known !== now?.role).map((value) => ({ value, label: t(`common:roles.${value}`) }));
  return (
    <>
      <SelectField
        name="role"
        label={t('role')}
        hint={role && t(`sees.${role}`)}
        options={options}
        empty={now ? t('change.keep', { role: t(`common:roles.${now.role}`) }) : t('choose')}
        none={{ value: undefined }}
      />
      {role === 'district-rep' && <SideField />}
      {isScoped(role) && (
        <AssignmentFields places={places} storeNames={storeNames} onNamed={(id, name) => setStoreNames((known) => new Map(known).set(id, name))} />
      )}
      {grantsOf(role).length > 0 && <GrantFields offered={grantsOf(role)} />}
    </>
  );
}

const storesOf = (member?: MemberOf): ReadonlyMap<string, string> =>
  new Map(member?.scopes.filter(({ kind }) => kind === 'store').map(({ id, name }) => [id, name]));

function SideField() {
  const { t } = useTranslation('people');
  const { setValue } = useFormContext<Values>();
  const side = useWatch<Values, 'side'>({ name: 'side' });
  const choices = sides.map((value) => ({ value, title: t(`side.${value}`), hint: t(`side.${value}-hint`) }));
  return (
    <ChoiceCards
      legend={t('side.legend')}
      name="side"
      choices={choices}
      value={side}
      onChange={(value) => setValue('side', value, { shouldDirty: true })}
    />
  );
}
