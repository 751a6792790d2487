import { useTranslation } from 'react-i18next';
import { useFilters } from '../../table/use-filters';
import { SegmentedControl } from '../../ui/segmented-control';

/** The same freezers as a list or on a map; in the URL. */
export function ViewSwitch() {
  const { t } = useTranslation('freezers');
  const filters = useFilters();
  const segments = (['list', 'map'] as const).map((value) => ({ value, short: t(`view.${value}`), label: t(`view.${value}`) }));
  return (
    <SegmentedControl
      label={t('view.label')}
      segments={segments}
      value={filters.get('view') === 'map' ? 'map' : 'list'}
      onChange={(view) => filters.set('view', view === 'map' ? 'map' : '')}
    />
  );
}
