import { useTranslation } from 'react-i18next';
import type { ComingAnswer as Told, ComingSaid } from '../../../server/domain/answers';
import { AnswerBox, type Tone } from './answer-box';
import type { Telling } from './answers';
import { useStoreWords } from './use-store-words';

const tones: Record<ComingSaid['key'], Tone> = {
  none: 'unsure',
  ahead: 'fine',
  today: 'fine',
  'in-window': 'fine',
  late: 'bad',
  missed: 'bad',
  delivered: 'fine',
};

type Aside = 'late' | 'now' | 'delivered';
const asides: Partial<Record<ComingSaid['key'], Aside>> = { late: 'late', 'in-window': 'now', delivered: 'delivered' };

export function ComingAnswer({ answer, zone, now }: Telling & { answer: Told }) {
  const { t } = useTranslation('store');
  const { said } = answer;
  const aside = asides[said.key];
  return (
    <AnswerBox question={t('answers.coming.question')} value={useHeadline(answer, zone, now)} aside={aside && t(`answers.coming.${aside}`)} tone={tones[said.key]}>
      <p>
        <Sentence said={said} window={answer.value} zone={zone} now={now} />
      </p>
    </AnswerBox>
  );
}

function useHeadline({ value, said }: Told, zone: string, now: number): string {
  const { t } = useTranslation('store');
  const say = useStoreWords(zone, now);
  if (value) return say.headline(value);
  if (said.key === 'delivered') return say.time(said.at);
  return t(said.key === 'missed' ? 'answers.coming.missed' : 'answers.coming.none');
}

function Sentence({ said, window, zone, now }: { said: ComingSaid; window: Told['value']; zone: string; now: number }) {
  const { t } = useTranslation('store');
  const say = useStoreWords(zone, now);
  const bags = (key: 'bags' | 'left', count: number) => t(`answers.coming.${key}`, { count, bags: say.number(count) });
  switch (said.key) {
    case 'none':
      return said.deliveryDays.length > 0 ? t('answers.coming.usual', { days: say.weekdays(said.deliveryDays) }) : t('answers.coming.unusual');
    case 'missed':
      return t('answers.coming.due-missed', { day: say.weekday(said.day) });
    case 'delivered':
      return `${bags('left', said.bags)} ${said.next ? t('answers.coming.next', { when: say.dayAndWindow(said.next) }) : ''}`;
    case 'late':
      return `${t('answers.coming.due', { time: say.time(said.dueBy), late: say.duration(said.lateMs) })} ${said.bags > 0 ? bags('bags', said.bags) : ''}`;
    case 'in-window':
      return `${t('answers.coming.in-window', { time: say.time(window?.to ?? now) })} ${said.bags > 0 ? bags('bags', said.bags) : ''}`;
    case 'ahead':
    case 'today':
      return said.bags > 0 ? bags('bags', said.bags) : t('answers.coming.no-load');
  }
}
