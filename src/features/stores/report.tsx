import { useTranslation } from 'react-i18next';
import { useNavigate } from 'react-router-dom';
import type { StorePage } from '../../../server/contract/stores';
import { page, type Place } from '../../api/page';
import { useTyped } from '../../form/typed';
import { PageTitle } from '../../layouts/page-title';
import { Allowed } from './allowed';
import { FiledReport } from './filed-report';
import { usePhotos } from './photos';
import { ReportDetails } from './report-details';
import { ReportFreezer } from './report-freezer';
import { ReportKind } from './report-kind';
import { reportStep, withAnswers, type ReportStep } from './report-steps';
import { StoreFrame } from './store-frame';
import { storeQuery } from './store-query';
import { usePhotoSending } from './use-photo-sending';

export const reportPage = page({ queries: (place) => ({ found: storeQuery(place) }), View: Report });

interface Props {
  found: StorePage;
  place: Place;
}

/** Three taps: what, where, send. The answers stand in the address; the photos stay here while the steps change. */
function Report({ found, place }: Props) {
  const { t } = useTranslation('report');
  const step = reportStep(place.search, found.freezers.map(({ id }) => id));
  return (
    <StoreFrame store={found.store} narrow>
      <Allowed to="create" what="Request" where={{ storeId: found.store.id, kind: 'other' }}>
        <PageTitle title={t('title')} />
        <h1 className="text-title font-bold">{t('title')}</h1>
        <Steps step={step} found={found} place={place} />
      </Allowed>
    </StoreFrame>
  );
}

function Steps({ step, found, place }: Props & { step: ReportStep }) {
  const navigate = useNavigate();
  const photos = usePhotos();
  const sending = usePhotoSending(place.params.producer ?? '', photos.photos);
  useTyped(photos.photos.length > 0 && step.step !== 'filed');
  const of = found.freezers.length > 1 ? 3 : 2;
  const filed = (requestId: string) => {
    if (photos.photos.length > 0) sending.send(requestId);
    void navigate(withAnswers(new URLSearchParams(), { filed: requestId }), { replace: true });
  };

  switch (step.step) {
    case 'kind':
      return <ReportKind search={place.search} of={of} />;
    case 'freezer':
      return <ReportFreezer search={place.search} of={of} freezers={found.freezers} />;
    case 'details':
      return <ReportDetails key={step.kind} step={step} found={found} place={place} of={of} photos={photos} onFiled={filed} />;
    case 'filed':
      return <FiledReport requestId={step.requestId} store={found.store} sending={sending} />;
  }
}
