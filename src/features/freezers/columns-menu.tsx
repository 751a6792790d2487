import { Columns3 } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import { Menu } from '../../ui/menu';
import type { Columns } from './use-columns';

/** Which columns the table has; for whoever looks at a table, not at cards. */
export function ColumnsMenu({ columns }: { columns: Columns }) {
  const { t } = useTranslation('freezers');
  const trigger = (
    <>
      <Columns3 aria-hidden size={18} />
      <span className="px-1">{t('columns.choose')}</span>
    </>
  );
  return (
    <div className="hidden rounded-control border border-edge bg-surface lg:block">
      <Menu trigger={trigger}>
        <fieldset>
          <legend className="sr-only">{t('columns.choose')}</legend>
          {columns.all.map((column) => (
            <label key={column} className="flex min-h-10 items-center gap-3 rounded-control px-3 hover:bg-sunk">
              <input type="checkbox" className="size-4.5 accent-fjord" checked={columns.shown.includes(column)} onChange={() => columns.toggle(column)} />
              {t(`columns.${column}`)}
            </label>
          ))}
        </fieldset>
      </Menu>
    </div>
  );
}
