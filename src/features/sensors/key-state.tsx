import { useTranslation } from 'react-i18next';
import { useFormat } from '../../lib/format';
import { useMembership } from '../../lib/me';
import { Tag } from '../../ui/tag';
import { keyEnded } from './key-ended';

interface Props {
  endsAt: number | null;
  now: number;
}

/** Whether a key still opens the door, and until when. */
export function KeyState({ endsAt, now }: Props) {
  const { t } = useTranslation('sensors');
  const format = useFormat(useMembership().producer.timeZone);
  if (endsAt === null) {
    return (
      <Tag tone="kelp" shape="dot">
        {t('keys.states.in-use')}
      </Tag>
    );
  }
  if (!keyEnded(endsAt, now)) {
    return (
      <Tag tone="straw" shape="diamond">
        {t('keys.states.ends', { when: format.when(endsAt) })}
      </Tag>
    );
  }
  return (
    <>
      <Tag shape="ring">{t('keys.states.ended')}</Tag>
      <span className="mt-0.5 block text-small text-ink-3">{format.when(endsAt)}</span>
    </>
  );
}
