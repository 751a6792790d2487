import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { Button, ButtonRow } from '../ui/button';
import { RetireDialog, type Retiring } from './retire-dialog';

interface Props extends Omit<Retiring, 'words'> {
  /** The noun of `locales/` whose `retire` and `restore` say what each act is about. */
  noun: string;
}

/** Below the form about something: taking it out of use, or back into it. */
export function RetireSection({ noun, ...retiring }: Props) {
  const { t } = useTranslation(noun);
  const { t: common } = useTranslation();
  const [asking, setAsking] = useState(false);
  const act = retiring.thing.retired ? 'restore' : 'retire';
  return (
    <section aria-label={common('retire.section')} className="mt-8 grid gap-3 border-t border-rule pt-5">
      <p className="text-ink-2">{t(`${act}.about`)}</p>
      <ButtonRow>
        <Button variant="quiet" size="big" onClick={() => setAsking(true)}>
          {t(`${act}.button`)}
        </Button>
      </ButtonRow>
      {asking && <RetireDialog {...retiring} words={{ retire: t('retire.words'), restore: t('restore.words') }} onClose={() => setAsking(false)} />}
    </section>
  );
}
