import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import type { StorePage } from '../../../server/contract/stores';
import type { Place } from '../../api/page';
import { linkClass } from '../../ui/link-class';
import { Caution } from './caution';
import { PhotoPicker } from './photo-picker';
import type { usePhotos } from './photos';
import { RequestForm } from './request-form';
import { withAnswers, type ReportStep } from './report-steps';
import { StepHeading } from './step-heading';

interface Props {
  step: Extract<ReportStep, { step: 'details' }>;
  found: StorePage;
  place: Place;
  of: number;
  photos: ReturnType<typeof usePhotos>;
  onFiled: (requestId: string) => void;
}

/** The last tap: send it as it is, or with words and photos. */
export function ReportDetails({ step, found, place, of, photos, onFiled }: Props) {
  const { t } = useTranslation('report');
  const { kind, freezerId } = step;
  return (
    <section className="mt-4">
      <p className="text-small text-ink-3">{t('step', { step: of, of })}</p>
      <StepHeading>{t('details.question')}</StepHeading>
      <p className="text-ink-2">{t('details.optional')}</p>
      <Chosen step={step} found={found} search={place.search} />
      <div className="mt-3">
        <Caution kind={kind} store={found.store} />
      </div>
      <RequestForm
        start={{ storeId: found.store.id, kind, freezerId }}
        label={t('details.words')}
        hint={t('details.words-hint')}
        send={t('details.send')}
        onFiled={onFiled}
      >
        <PhotoPicker {...photos} />
      </RequestForm>
    </section>
  );
}

/** What was answered so far, each with a way to answer anew. */
function Chosen({ step, found, search }: Pick<Props, 'step' | 'found'> & { search: URLSearchParams }) {
  const { t } = useTranslation(['report', 'requests']);
  const { kind, freezerId } = step;
  const freezer = found.freezers.find(({ id }) => id === freezerId)?.name ?? t('freezer.none');
  const rows = [
    { label: t('kind.question'), value: t(`requests:kinds.${kind}`), again: withAnswers(search, { kind: null }) },
    ...(found.freezers.length > 1 ? [{ label: t('freezer.question'), value: freezer, again: withAnswers(search, { freezer: null }) }] : []),
  ];
  return (
    <dl className="mt-3 divide-y divide-rule rounded-card border border-rule bg-surface">
      {rows.map(({ label, value, again }) => (
        <div key={label} className="grid grid-cols-[minmax(0,1fr)_auto] gap-x-3 px-4 py-1.5">
          <dt className="text-small text-ink-3">{label}</dt>
          <dd className="font-semibold">{value}</dd>
          <dd className="col-start-2 row-span-2 row-start-1 self-center">
            <Link to={again} aria-label={t('change-what', { what: label })} className={linkClass('big')}>
              {t('change')}
            </Link>
          </dd>
        </div>
      ))}
    </dl>
  );
}
