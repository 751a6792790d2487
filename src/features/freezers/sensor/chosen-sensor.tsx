import { useEffect, useRef } from 'react';
import { useTranslation } from 'react-i18next';
import { Button } from '../../../ui/button';

interface Props {
  serial: string;
  onAnother: () => void;
}

/** The sensor picked, and the way to another. */
export function ChosenSensor({ serial, onAnother }: Props) {
  const { t } = useTranslation('freezer-page');
  const box = useRef<HTMLDivElement>(null);
  // The pressed button is gone with its list.
  useEffect(() => box.current?.focus(), []);
  return (
    <div ref={box} tabIndex={-1} className="flex flex-wrap items-center justify-between gap-3 rounded-card border border-rule bg-surface px-4 py-3 outline-none">
      <p className="min-w-0">
        <span className="block text-small text-ink-3">{t('tie.chosen')}</span>
        <span className="block font-semibold wrap-anywhere">{serial}</span>
      </p>
      <Button variant="quiet" size="big" onClick={onAnother}>
        {t('tie.another')}
      </Button>
    </div>
  );
}
