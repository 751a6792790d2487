import { useTranslation } from 'react-i18next';
import type { Freezer } from '../../../server/contract/freezers';
import { freshnessOf } from '../../../server/domain/freshness';
import type { Standing } from '../../../server/domain/freezer-standing';
import { Tag, type TagTone } from '../../ui/tag';
import { useStoreWords } from './use-store-words';

type TagKey = Standing['kind'] | 'warm';

const tones: Record<TagKey, TagTone> = {
  'no-sensor': 'quiet',
  waiting: 'straw',
  silent: 'straw',
  warm: 'rust',
  empty: 'rust',
  'perhaps-empty': 'ember',
  'runs-out-first': 'ember',
  'may-run-out-first': 'ember',
  'truck-first': 'fjord',
  'runs-out': 'quiet',
  'runs-out-untold': 'quiet',
  keeps: 'quiet',
  learning: 'quiet',
};

interface Props {
  freezer: Freezer;
  standing: Standing;
  now: number;
}

/** How a freezer stands, in a few words. */
export function FreezerTag({ freezer, standing, now }: Props) {
  const { t } = useTranslation('store');
  const say = useStoreWords('UTC', now);
  const key = tagKey(freezer, standing, now);
  const keeps = standing.kind === 'keeps' ? { day: standing.past && say.weekday(standing.past), context: standing.past ? undefined : 'beyond' } : {};
  return <Tag tone={tones[key]}>{t(`freezer.tags.${key}`, keeps)}</Tag>;
}

/** What cannot wait comes before what will run out; a sensor that fell silent before what it last saw. */
function tagKey({ state }: Freezer, { kind }: Standing, now: number): TagKey {
  if (!state || kind === 'no-sensor' || kind === 'silent') return kind;
  const airBelieved = state.airAt !== null && freshnessOf(state.airAt, now) !== 'unusable';
  if (airBelieved && state.warmSince !== null) return 'warm';
  return freshnessOf(state.at, now) === 'silent' ? 'silent' : kind;
}
