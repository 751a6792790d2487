import { useTranslation } from 'react-i18next';
import { mapMarks } from '../../../../server/contract/fleet';
import { MarkShape } from '../../../map/mark-shape';
import { looks } from './drawn-stores';
import { useMarkKey } from './use-mark-key';

export function Legend() {
  const { t } = useTranslation('map');
  const keyOf = useMarkKey();
  return (
    <ul aria-label={t('legend')} className="flex flex-wrap gap-x-5 gap-y-1 text-small font-semibold text-ink-2">
      {mapMarks.map((mark) => (
        <li key={mark} className="flex items-center gap-2 whitespace-nowrap">
          <span className={looks[mark].colour}>
            <MarkShape shape={looks[mark].shape} size={13} />
          </span>
          {t(`marks.${keyOf(mark)}`)}
        </li>
      ))}
    </ul>
  );
}
