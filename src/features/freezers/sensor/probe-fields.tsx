import { Minus, Plus } from 'lucide-react';
import { useFormContext, useWatch } from 'react-hook-form';
import { useTranslation } from 'react-i18next';
import type { BodyInput } from '../../../../server/contract/endpoint';
import type { api } from '../../../../server/contract/index';
import { NumberField } from '../../../form/number-field';
import { useListFault } from '../../../form/use-list-fault';
import { useFormat } from '../../../lib/format';
import { Button, ButtonRow } from '../../../ui/button';
import { FieldError } from '../../../ui/field';
import { evenPlaces } from './probe-places';

type Values = BodyInput<typeof api.freezers.tieSensor>;

interface Props {
  widthIn: number;
  /** Channels the sensor sends; 0 where it has sent nothing. */
  sent: number;
}

const most = 8;

/** Where each probe hangs, from the left inside wall. */
export function ProbeFields({ widthIn, sent }: Props) {
  const { t } = useTranslation('freezer-page');
  const { inches } = useFormat();
  const { setValue, formState } = useFormContext<Values>();
  const probes = useWatch<Values, 'probesIn'>({ name: 'probesIn' });
  const { fault, faultId } = useListFault('probesIn');
  const spread = (count: number) => setValue('probesIn', evenPlaces(count, widthIn), { shouldDirty: true, shouldValidate: formState.isSubmitted });
  return (
    <fieldset className="min-w-0" aria-describedby={faultId}>
      <legend className="text-lead font-bold">{t('probes.title')}</legend>
      <p className="text-ink-2">{t('probes.lead', { width: inches(widthIn) })}</p>
      {sent > 0 && sent !== probes.length && <p className="font-semibold text-straw">{t('probes.sends', { count: sent })}</p>}
      {faultId && <FieldError id={faultId}>{fault}</FieldError>}
      <div className="mt-2 grid grid-cols-2 gap-3 sm:grid-cols-3">
        {probes.map((_, i) => (
          <NumberField key={i} name={`probesIn.${i}`} label={t('probes.probe', { n: i + 1 })} />
        ))}
      </div>
      <div className="mt-3">
        <ButtonRow>
          <Button variant="quiet" size="big" disabled={probes.length >= most} onClick={() => spread(probes.length + 1)}>
            <Plus aria-hidden size={18} />
            {t('probes.more')}
          </Button>
          <Button variant="quiet" size="big" disabled={probes.length <= 1} onClick={() => spread(probes.length - 1)}>
            <Minus aria-hidden size={18} />
            {t('probes.fewer')}
          </Button>
        </ButtonRow>
      </div>
    </fieldset>
  );
}
