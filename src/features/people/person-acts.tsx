import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { api } from '../../../server/contract/index';
import type { MemberOf } from '../../../server/contract/people';
import { useAct } from '../../api/act';
import { ProblemNote } from '../../form/problem-note';
import { useMembership } from '../../lib/me';
import { Button, ButtonRow } from '../../ui/button';
import { SeeAs } from './see-as';

interface Props {
  member: MemberOf;
  onDone: (words: string) => void;
  onLeave: () => void;
}

/** What can be done about somebody besides changing their role. */
export function PersonActs({ member, onDone, onLeave }: Props) {
  const { id, name, active } = member;
  const { t } = useTranslation('people');
  const { producer, membershipId } = useMembership();
  const [asking, setAsking] = useState(false);
  const again = useAct(api.people.inviteAgain, []);
  const activate = useAct(api.people.change, [api.people.list, api.requests.assignees]);
  const params = { producer: producer.slug, memberId: id };
  const problem = again.error ?? activate.error;
  const sendAgain = () => again.mutate({ params }, { onSuccess: () => onDone(t('done.again', { name })) });
  const bringBack = () => activate.mutate({ params, body: { active: true } }, { onSuccess: () => onDone(t('done.activated', { name })) });
  return (
    <div className="grid gap-2">
      <ButtonRow>
        {active ? (
          <>
            <Button variant="quiet" busy={again.isPending} label={t('again.of', { name })} onClick={sendAgain}>
              {t('again.button')}
            </Button>
            {id !== membershipId && (
              <Button variant="quiet" onClick={() => setAsking(true)}>
                {t('see-as.button', { name })}
              </Button>
            )}
            <Button variant="quiet" label={t('deactivate.of', { name })} onClick={onLeave}>
              {t('deactivate.button')}
            </Button>
          </>
        ) : (
          <Button variant="quiet" busy={activate.isPending} label={t('activate.of', { name })} onClick={bringBack}>
            {t('activate.button')}
          </Button>
        )}
      </ButtonRow>
      {problem && <ProblemNote problem={problem} />}
      {asking && <SeeAs member={member} onClose={() => setAsking(false)} />}
    </div>
  );
}
