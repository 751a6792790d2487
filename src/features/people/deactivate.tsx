import { useState } from 'react';
import { useQuery } from '@tanstack/react-query';
import { useTranslation } from 'react-i18next';
import { api } from '../../../server/contract/index';
import type { MemberOf } from '../../../server/contract/people';
import { useAct } from '../../api/act';
import { q } from '../../api/query';
import { ProblemNote } from '../../form/problem-note';
import { useMembership } from '../../lib/me';
import { Button, ButtonRow } from '../../ui/button';
import { Dialog } from '../../ui/dialog';
import { Field } from '../../ui/field';
import { Select } from '../../ui/select';

interface Props {
  /** Who is about to lose access; null while nobody is. */
  member: MemberOf | null;
  onClose: () => void;
  onDone: (words: string) => void;
}

/** Ends somebody's access, after one question; their open requests can go to somebody else. */
export function Deactivate({ member, onClose, onDone }: Props) {
  const { t } = useTranslation('people');
  return (
    <Dialog open={member !== null} title={t('deactivate.title', { name: member?.name })} onClose={onClose}>
      {member && <Question member={member} onClose={onClose} onDone={onDone} />}
    </Dialog>
  );
}

function Question({ member: { id, name }, onClose, onDone }: Props & { member: MemberOf }) {
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
    <div className="grid gap-4">
      <p>{t('deactivate.words')}</p>
      <Successor leaving={id} value={successor} onChange={setSuccessor} />
      {change.error && <ProblemNote problem={change.error} />}
      <ButtonRow>
        <Button variant="danger" busy={change.isPending} onClick={deactivate}>
          {t('deactivate.yes')}
        </Button>
        <Button variant="quiet" onClick={onClose}>
          {t('deactivate.no')}
        </Button>
      </ButtonRow>
    </div>
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
