import { useTranslation } from 'react-i18next';
import type { ColdSaid } from '../../../server/domain/answers';
import { useStoreWords } from './use-store-words';

interface Props {
  said: ColdSaid;
  zone: string;
  now: number;
}

/** Whether it is cold, in a sentence. */
export function ColdSentence({ said, zone, now }: Props) {
  const { t } = useTranslation('store');
  const say = useStoreWords(zone, now);
  const key = `answers.cold.said.${said.key}` as const;
  switch (said.key) {
    case 'silent':
      return t(key, { when: say.when(said.heard) });
    case 'warm':
      return `${t(key, { freezer: said.freezer, since: say.whenBefore(said.since) })} ${said.others > 0 ? t('answers.cold.said.warm-others', { count: said.others }) : ''}`;
    case 'above-once':
      return t(key, { freezer: said.freezer });
    case 'holding':
      return t(key, { count: said.count, context: said.count === 2 ? 'both' : undefined });
    case 'holding-some':
      return t(key, { count: said.count, all: said.count + said.unknown });
    case 'no-freezers':
    case 'no-sensor':
    case 'waiting':
      return t(key);
  }
}
