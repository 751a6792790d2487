import { ArrowLeft, ArrowRight, Plus, X } from 'lucide-react';
import { useFieldArray, useFormContext, useWatch } from 'react-hook-form';
import { useTranslation } from 'react-i18next';
import type { BodyInput } from '../../../../server/contract/endpoint';
import type { api } from '../../../../server/contract/index';
import { SelectField } from '../../../form/select-field';
import { useListFault } from '../../../form/use-list-fault';
import { Button, ButtonRow, IconButton } from '../../../ui/button';
import { FieldError } from '../../../ui/field';
import { evenShares } from './lane-shares';
import { LanePreview } from './lane-preview';
import { ShareField } from './share-field';
import { ShareSum } from './share-sum';

type Values = BodyInput<typeof api.freezers.create>;

interface Props {
  products: { value: string; label: string }[];
}

const most = 8;

/** The lanes from left to right: what each holds, and its part of the width. */
export function LaneFields({ products }: Props) {
  const { t } = useTranslation('freezer-form');
  const { formState, setValue } = useFormContext<Values>();
  const { fields, append, remove, move } = useFieldArray<Values, 'lanes'>({ name: 'lanes' });
  const lanes = useWatch<Values, 'lanes'>({ name: 'lanes' });
  const { fault, faultId } = useListFault('lanes');
  const evenOut = () => {
    for (const [i, share] of evenShares(fields.length).entries()) setValue(`lanes.${i}.widthShare`, share, { shouldDirty: true, shouldValidate: formState.isSubmitted });
  };
  return (
    <fieldset className="grid min-w-0 gap-3" aria-describedby={faultId}>
      <legend className="sr-only">{t('lanes.title')}</legend>
      <p className="text-ink-2">{t('lanes.lead')}</p>
      <LanePreview lanes={lanes} products={products} />
      {faultId && <FieldError id={faultId}>{fault}</FieldError>}
      {fields.map(({ id }, i) => (
        <div key={id} role="group" aria-label={t('lanes.lane', { n: i + 1 })} className="rounded-card border border-rule bg-surface px-4 pt-1 pb-4">
          <div className="-mr-3 flex items-center">
            <span aria-hidden className="mr-auto text-small text-ink-3">
              {t('lanes.lane', { n: i + 1 })}
            </span>
            <IconButton label={t('lanes.left', { n: i + 1 })} icon={<ArrowLeft aria-hidden size={20} />} disabled={i === 0} onClick={() => move(i, i - 1)} />
            <IconButton label={t('lanes.right', { n: i + 1 })} icon={<ArrowRight aria-hidden size={20} />} disabled={i === fields.length - 1} onClick={() => move(i, i + 1)} />
            <IconButton label={t('lanes.remove', { n: i + 1 })} icon={<X aria-hidden size={20} />} disabled={fields.length === 1} onClick={() => remove(i)} />
          </div>
          <div className="grid gap-3 sm:grid-cols-[minmax(0,1fr)_9rem]">
            <SelectField name={`lanes.${i}.productId`} label={t('lanes.product')} options={products} empty={t('choose')} none={{ value: undefined }} />
            <ShareField name={`lanes.${i}.widthShare`} label={t('lanes.share')} />
          </div>
        </div>
      ))}
      <ShareSum shares={lanes.map(({ widthShare }) => widthShare)} />
      <ButtonRow>
        {/* A lane without a product yet: the choice is asked for when the form is sent. */}
        <Button variant="quiet" size="big" disabled={fields.length >= most} onClick={() => append({ productId: '', widthShare: NaN })}>
          <Plus aria-hidden size={18} />
          {t('lanes.add')}
        </Button>
        <Button variant="quiet" size="big" onClick={evenOut}>
          {t('lanes.even')}
        </Button>
      </ButtonRow>
    </fieldset>
  );
}
