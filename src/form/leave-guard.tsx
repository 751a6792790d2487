import { useEffect } from 'react';
import { useTranslation } from 'react-i18next';
import { useBlocker } from 'react-router-dom';
import { Button } from '../ui/button';
import { Dialog } from '../ui/dialog';
import { anythingUnsent } from './typed';

/** Asks before typed words are lost, once for the whole application. */
export function LeaveGuard() {
  const { t } = useTranslation();
  const blocker = useBlocker(
    ({ currentLocation, nextLocation }) => anythingUnsent() && currentLocation.pathname !== nextLocation.pathname,
  );
  useEffect(() => {
    const ask = (event: BeforeUnloadEvent) => {
      if (anythingUnsent()) event.preventDefault();
    };
    window.addEventListener('beforeunload', ask);
    return () => window.removeEventListener('beforeunload', ask);
  }, []);

  return (
    <Dialog open={blocker.state === 'blocked'} title={t('leave.title')} onClose={() => blocker.reset?.()}>
      <p>{t('leave.words')}</p>
      <div className="mt-4 grid gap-3 sm:flex">
        <Button onClick={() => blocker.reset?.()}>{t('leave.stay')}</Button>
        <Button variant="quiet" onClick={() => blocker.proceed?.()}>
          {t('leave.go')}
        </Button>
      </div>
    </Dialog>
  );
}
