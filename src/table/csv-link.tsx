import { Download } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import { buttonClass } from '../ui/button';

/** The whole list, with the filters it has now, as a file for a spreadsheet. */
export function CsvLink({ href }: { href: string }) {
  const { t } = useTranslation();
  return (
    <a href={href} download className={buttonClass('quiet')}>
      <Download aria-hidden size={18} />
      {t('csv')}
    </a>
  );
}
