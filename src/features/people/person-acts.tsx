import { useTranslation } from 'react-i18next';
import { api } from '../../../server/contract/index';
import type { MemberOf } from '../../../server/contract/people';
import { useAct } from '../../api/act';
import { ProblemNote } from '../../form/problem-note';
import { useMembership } from '../../lib/me';
import { Button, ButtonRow } from '../../ui/button';

interface Props {
  member: MemberOf;
  onDone: (words: string) => void;
  onLeave: () => void;
}

/** What can be done about somebody besides changing their role. */
export function PersonActs({ member: { id, name, active }, onDone, onLeave }: Props) {
  const { t } = useTranslation('people');
  const { slug } = useMembership().producer;
  const again = useAct(api.people.inviteAgain, []);
  const activate = useAct(api.people.change, [api.people.list, api.requests.assignees]);
  const params = { producer: slug, memberId: id };
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
    </div>
  );
}
