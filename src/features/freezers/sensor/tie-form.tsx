import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { useNavigate } from 'react-router-dom';
import type { Freezer } from '../../../../server/contract/freezers';
import { api } from '../../../../server/contract/index';
import { Form } from '../../../form/form';
import { SubmitButton } from '../../../form/submit-button';
import { useContractForm } from '../../../form/use-contract-form';
import { useMembership } from '../../../lib/me';
import { paths } from '../../../paths';
import { Button } from '../../../ui/button';
import { Notice } from '../../../ui/notice';
import { showsFreezers } from '../shows-freezers';
import { ChosenSensor } from './chosen-sensor';
import { ConfirmMove } from './confirm-move';
import { evenPlaces } from './probe-places';
import { ProbeFields } from './probe-fields';
import { SensorSearch, type FoundSensor } from './sensor-search';

interface Props {
  freezer: Freezer;
  /** What the search begins with. */
  serial: string;
}

/** Probes of a sensor that has not sent a reading yet (common practice, no published source). */
const usualProbes = 3;

/** Which sensor, and where its probes are; one that hangs elsewhere moves only after a yes. */
export function TieForm({ freezer, serial }: Props) {
  const { t } = useTranslation('freezer-page');
  const navigate = useNavigate();
  const { slug } = useMembership().producer;
  const [chosen, setChosen] = useState<FoundSensor | null>(null);
  const [asked, setAsked] = useState<FoundSensor | null>(null);
  const form = useContractForm(api.freezers.tieSensor, {
    start: { sensorId: '', probesIn: [], move: false },
    input: (body) => ({ params: { producer: slug, freezerId: freezer.id }, body }),
    stale: showsFreezers,
    onDone: () => void navigate(paths.freezer(slug, freezer.id)),
  });
  const { setValue } = form.fields;
  const take = (sensor: FoundSensor, move: boolean) => {
    setAsked(null);
    setChosen(sensor);
    setValue('sensorId', sensor.id, { shouldDirty: true });
    setValue('move', move);
    setValue('probesIn', evenPlaces(sensor.probes || usualProbes, freezer.model.insideWidthIn), { shouldDirty: true });
  };
  const choose = (sensor: FoundSensor) => {
    if (sensor.freezer && sensor.freezer.id !== freezer.id) setAsked(sensor);
    else take(sensor, false);
  };
  const moveAfterAll = () => {
    setValue('move', true);
    void form.submit();
  };
  return (
    <Form form={form} className="mt-5">
      {form.problem?.type === 'sensor-elsewhere' && (
        <div>
          <Button variant="quiet" size="big" busy={form.pending} onClick={moveAfterAll}>
            {t('tie.move-yes')}
          </Button>
        </div>
      )}
      {chosen ? (
        <>
          <ChosenSensor serial={chosen.serial} onAnother={() => setChosen(null)} />
          {freezer.sensor && freezer.sensor.id !== chosen.id && <Notice title={t('tie.replaces', { serial: freezer.sensor.serial })} />}
          <ProbeFields widthIn={freezer.model.insideWidthIn} sent={chosen.probes} />
          <SubmitButton wide>{t('tie.save', { serial: chosen.serial })}</SubmitButton>
        </>
      ) : (
        <SensorSearch serial={serial} here={freezer.id} onChoose={choose} />
      )}
      {asked?.freezer && <ConfirmMove serial={asked.serial} from={asked.freezer} onClose={() => setAsked(null)} onMove={() => take(asked, true)} />}
    </Form>
  );
}
