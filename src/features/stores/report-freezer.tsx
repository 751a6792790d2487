import { Refrigerator, Store } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import type { Freezer } from '../../../server/contract/freezers';
import { ChoiceCard } from './choice-card';
import { noFreezer, withAnswers } from './report-steps';
import { StepHeading } from './step-heading';

interface Props {
  search: URLSearchParams;
  of: number;
  freezers: Freezer[];
}

/** The second tap: which freezer. */
export function ReportFreezer({ search, of, freezers }: Props) {
  const { t } = useTranslation('report');
  return (
    <section className="mt-4">
      <p className="text-small text-ink-3">{t('step', { step: 2, of })}</p>
      <StepHeading>{t('freezer.question')}</StepHeading>
      <ul className="mt-3 grid gap-2">
        {freezers.map(({ id, name, assetNumber }) => (
          <li key={id}>
            <ChoiceCard to={withAnswers(search, { freezer: id })} title={name} hint={t('freezer.asset', { number: assetNumber })} Icon={Refrigerator} />
          </li>
        ))}
        <li>
          <ChoiceCard to={withAnswers(search, { freezer: noFreezer })} title={t('freezer.none')} Icon={Store} />
        </li>
      </ul>
    </section>
  );
}
