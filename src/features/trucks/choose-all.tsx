import { useTranslation } from 'react-i18next';
import type { Chosen } from './use-chosen';

interface Props {
  chosen: Chosen;
  /** The rows there are to choose from. */
  shown: string[];
}

/** All the rows shown, or none of them. */
export function ChooseAll({ chosen, shown }: Props) {
  const { t } = useTranslation('trucks');
  const count = shown.filter(chosen.has).length;
  const all = count === shown.length;
  return (
    <label className="inline-flex min-h-12 cursor-pointer items-center gap-3 pl-4 lg:pl-3">
      <input
        ref={(box) => {
          if (box) box.indeterminate = count > 0 && !all;
        }}
        type="checkbox"
        checked={all}
        onChange={() => chosen.choose(shown, !all)}
        className="size-5 shrink-0 accent-fjord"
      />
      {t('choose-all', { count: shown.length })}
    </label>
  );
}
