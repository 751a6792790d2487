import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { Button, ButtonRow } from '../ui/button';
import { RetireDialog, type Retiring } from './retire-dialog';

interface Props extends Retiring {
  about: string;
  button: string;
}

/** Below the form about something: taking it out of use, or back into it. */
export function RetireSection({ about, button, ...retiring }: Props) {
  const { t } = useTranslation();
  const [asking, setAsking] = useState(false);
  return (
    <section aria-label={t('retire.section')} className="mt-8 grid gap-3 border-t border-rule pt-5">
      <p className="text-ink-2">{about}</p>
      <ButtonRow>
        <Button variant="quiet" size="big" onClick={() => setAsking(true)}>
          {button}
        </Button>
      </ButtonRow>
      {asking && <RetireDialog {...retiring} onClose={() => setAsking(false)} />}
    </section>
  );
}
