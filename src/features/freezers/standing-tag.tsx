import { useTranslation } from 'react-i18next';
import type { FleetStanding } from '../../../server/domain/fleet-standing';
import { useFormat } from '../../lib/format';
import { Tag, type TagShape, type TagTone } from '../../ui/tag';

interface Props {
  standing: FleetStanding;
  now: number;
}

/** What is wrong with a freezer, in a few words and a shape; nothing where nothing is. */
export function StandingTag({ standing, now }: Props) {
  const words = useStandingWords(standing, now);
  if (standing.kind === 'fine') return null;
  return <Tag {...looks[standing.kind]}>{words}</Tag>;
}

function useStandingWords(standing: FleetStanding, now: number): string {
  const { t } = useTranslation('freezers');
  const format = useFormat();
  switch (standing.kind) {
    case 'warm':
      return t('standing.warm', { time: format.duration(now - standing.since) });
    case 'silent':
      return t('standing.silent', { time: format.duration(wholeHours(now - standing.since)) });
    case 'first':
      return t('standing.first', { time: format.duration(wholeHours(standing.ms)) });
    case 'empty':
      return standing.product === null ? t('standing.empty') : t('standing.empty-product', { product: standing.product });
    case 'tight':
    case 'soon':
    case 'soon-untold':
    case 'unfitted':
    case 'waiting':
    case 'fine':
      return t(`standing.${standing.kind}`);
  }
}

const HOUR = 3_600_000;
/** A run-out is not known finer. */
const wholeHours = (ms: number): number => Math.max(1, Math.round(ms / HOUR)) * HOUR;

const looks: Record<Exclude<FleetStanding['kind'], 'fine'>, { tone: TagTone; shape?: TagShape }> = {
  warm: { tone: 'rust', shape: 'diamond' },
  empty: { tone: 'rust', shape: 'triangle' },
  first: { tone: 'ember', shape: 'triangle' },
  soon: { tone: 'ember', shape: 'triangle' },
  'soon-untold': { tone: 'ember', shape: 'triangle' },
  tight: { tone: 'ember' },
  silent: { tone: 'straw', shape: 'ring' },
  unfitted: { tone: 'quiet' },
  waiting: { tone: 'quiet' },
};
