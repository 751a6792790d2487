import { useState } from 'react';
import { useQuery } from '@tanstack/react-query';
import { useTranslation } from 'react-i18next';
import { api } from '../../../server/contract/index';
import type { MemberOf } from '../../../server/contract/people';
import { useAct } from '../../api/act';
import { q } from '../../api/query';
import { Confirm } from '../../form/confirm';
import { useMembership } from '../../lib/me';
import { Field } from '../../ui/field';
import { Select } from '../../ui/select';

interface Props {
  /** Who is about to lose access. */
  member: MemberOf;
  onClose: () => void;
  onDone: (words: string) => void;
}

/** Ends somebody's access, after one question; their open requests can go to somebody else. */
export function Deactivate({ member: { id, name }, onClose, onDone }: Props) {
  const { t } = useTranslation('people');
  const { slug } = useMembership().producer;
  const [successor, setSuccessor] = useState('');
  const change = useAct(api.people.change, [api.people.list, api.requests.assignees, api.requests.list, api.requests.read]);
  const deactivate = () =>
    change.mutate(
      { params: { producer: slug, memberId: id }, body: { active: false, handOverTo: successor || null } },
      {
        onSuccess: () => {
          onDone(t('done.deactivated', { name }));
          onClose();
        },
      },
    );
  return (
    <Confirm title={t('deactivate.title', { name })} yes={t('deactivate.yes')} no={t('deactivate.no')} act={change} onYes={deactivate} onClose={onClose}>
      <p>{t('deactivate.words')}</p>
      <Successor leaving={id} value={successor} onChange={setSuccessor} />
    </Confirm>
  );
}

function Successor({ leaving, value, onChange }: { leaving: string; value: string; onChange: (memberId: string) => void }) {
  const { t } = useTranslation('people');
  const { slug } = useMembership().producer;
  const { data, error } = useQuery(q(api.requests.assignees, { params: { producer: slug } }));
  const others = (data?.assignees ?? []).filter(({ id }) => id !== leaving);
  return (
    <>
      <Field label={t('deactivate.successor')}>
        {(control) => (
          <Select {...control} value={value} onChange={(event) => onChange(event.target.value)}>
            <option value="">{t('deactivate.nobody')}</option>
            {others.map(({ id, name }) => (
              <option key={id} value={id}>
                {name}
              </option>
            ))}
          </Select>
        )}
      </Field>
      {error && <p className="text-rust">{t('deactivate.no-list')}</p>}
    </>
  );
}
