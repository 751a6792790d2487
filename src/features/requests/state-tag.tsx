import { useTranslation } from 'react-i18next';
import type { RequestState } from '../../../server/contract/words';
import { useFormat } from '../../lib/format';
import { Tag, type TagTone } from '../../ui/tag';

interface Props {
  state: RequestState;
  day: string | null;
}

/** The state in words; the colour only says it again. */
export function StateTag({ state, day }: Props) {
  const { t } = useTranslation('requests');
  const format = useFormat();
  const words = state === 'scheduled' && day ? t('states.scheduled-day', { day: format.day(day) }) : t(`states.${state}`);
  return <Tag tone={tones[state]}>{words}</Tag>;
}

const tones: Record<RequestState, TagTone> = {
  new: 'fjord',
  open: 'fjord',
  'waiting-on-store': 'straw',
  scheduled: 'kelp',
  solved: 'quiet',
  closed: 'quiet',
  cancelled: 'quiet',
};
