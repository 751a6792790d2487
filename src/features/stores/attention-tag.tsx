import { useTranslation } from 'react-i18next';
import type { Attention } from '../../../server/contract/stores';
import { Tag, type TagShape, type TagTone } from '../../ui/tag';

interface Props {
  attention: Attention;
  /** A truck is set, so that there is something to run out before. */
  truck: boolean;
}

/** What a store needs, in a word and a shape: triangle runs out, diamond warm, ring silent, dot fine. */
export function AttentionTag({ attention, truck }: Props) {
  const { t } = useTranslation('stores-list');
  const { shape, tone } = looks[attention];
  return (
    <Tag tone={tone} shape={shape}>
      {t(attention === 'runs-out-first' && !truck ? 'attention.runs-out-soon' : `attention.${attention}`)}
    </Tag>
  );
}

const looks: Record<Attention, { shape: TagShape; tone: TagTone }> = {
  warm: { shape: 'diamond', tone: 'rust' },
  empty: { shape: 'triangle', tone: 'rust' },
  'runs-out-first': { shape: 'triangle', tone: 'ember' },
  'truck-late': { shape: 'square', tone: 'ember' },
  silent: { shape: 'ring', tone: 'straw' },
  none: { shape: 'dot', tone: 'quiet' },
};
