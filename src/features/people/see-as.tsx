import { useTranslation } from 'react-i18next';
import { api } from '../../../server/contract/index';
import type { MemberOf } from '../../../server/contract/people';
import { useAct } from '../../api/act';
import { Confirm } from '../../form/confirm';
import { useMembership } from '../../lib/me';
import { paths } from '../../paths';

interface Props {
  /** Whose eyes are about to be borrowed. */
  member: MemberOf;
  onClose: () => void;
}

/** Shows the portal as somebody else sees it, after saying what that means. */
export function SeeAs({ member: { id, name }, onClose }: Props) {
  const { t } = useTranslation('people');
  const { slug } = useMembership().producer;
  const see = useAct(api.people.seeAs, []);
  // The session now answers as somebody else: nothing that is known here may stay.
  const begin = () => see.mutate({ params: { producer: slug, memberId: id } }, { onSuccess: () => window.location.assign(paths.home()) });
  const act = { error: see.error, isPending: see.isPending || see.isSuccess };
  return (
    <Confirm title={t('see-as.button', { name })} yes={t('see-as.yes')} no={t('see-as.no')} variant="primary" act={act} onYes={begin} onClose={onClose}>
      <p>{t('see-as.words')}</p>
    </Confirm>
  );
}
