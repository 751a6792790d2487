import { useTranslation } from 'react-i18next';
import type { Attention } from '../../../server/contract/stores';
import { Tag, type TagTone } from '../../ui/tag';

/** What a store needs, in a word and a shape: triangle runs out, diamond warm, ring silent, dot fine. */
export function AttentionTag({ attention }: { attention: Attention }) {
  const { t } = useTranslation('stores-list');
  const { shape, tone } = looks[attention];
  return (
    <Tag tone={tone}>
      <span aria-hidden>{shape}</span> {t(`attention.${attention}`)}
    </Tag>
  );
}

const looks: Record<Attention, { shape: string; tone: TagTone }> = {
  warm: { shape: '◆', tone: 'rust' },
  empty: { shape: '▲', tone: 'rust' },
  'runs-out-first': { shape: '▲', tone: 'ember' },
  'truck-late': { shape: '▶', tone: 'ember' },
  silent: { shape: '○', tone: 'straw' },
  none: { shape: '●', tone: 'quiet' },
};
