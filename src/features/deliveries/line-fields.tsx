import { Plus, X } from 'lucide-react';
import { useFieldArray, useWatch } from 'react-hook-form';
import { useTranslation } from 'react-i18next';
import type { BodyInput } from '../../../server/contract/endpoint';
import type { Freezer } from '../../../server/contract/freezers';
import type { api } from '../../../server/contract/index';
import { SelectField } from '../../form/select-field';
import { TextField } from '../../form/text-field';
import { useListFault } from '../../form/use-list-fault';
import { useFormat } from '../../lib/format';
import { Button, IconButton } from '../../ui/button';
import { FieldError } from '../../ui/field';
import { BagsField } from './bags-field';
import type { Products } from './record-delivery';

type Values = BodyInput<typeof api.deliveries.record>;

interface Props {
  products: Products;
  freezers: Freezer[];
}

/** What was left, line by line: which bags, into which freezer, how many, and what was taken back. */
export function LineFields({ products, freezers }: Props) {
  const { t } = useTranslation('deliveries');
  const { fields, append, remove } = useFieldArray<Values, 'lines'>({ name: 'lines' });
  const { fault, faultId } = useListFault('lines');
  return (
    <fieldset aria-describedby={faultId}>
      <legend className="font-semibold">{t('record.lines')}</legend>
      {faultId && <FieldError id={faultId}>{fault}</FieldError>}
      <div className="mt-2 grid gap-3">
        {fields.map(({ id }, i) => (
          <Line key={id} i={i} products={products} freezers={freezers} onRemove={() => remove(i)} />
        ))}
      </div>
      <div className="mt-3 flex flex-wrap items-center justify-between gap-3">
        <Button variant="quiet" size="big" onClick={() => append({ productId: '', freezerId: null, bags: 0, takenBack: 0, lot: '' })}>
          <Plus aria-hidden size={18} />
          {t('record.add')}
        </Button>
        <Total />
      </div>
    </fieldset>
  );
}

function Line({ i, products, freezers, onRemove }: Props & { i: number; onRemove: () => void }) {
  const { t } = useTranslation('deliveries');
  const name = (field: string) => `lines.${i}.${field}`;
  return (
    <div role="group" aria-label={t('record.line', { n: i + 1 })} className="rounded-card border border-rule bg-surface px-4 pt-1 pb-4">
      <div className="-mr-3 flex items-center justify-between">
        <span aria-hidden className="text-small text-ink-3">
          {t('record.line', { n: i + 1 })}
        </span>
        <IconButton label={t('record.remove', { n: i + 1 })} icon={<X aria-hidden size={20} />} onClick={onRemove} />
      </div>
      <div className="grid gap-3 sm:grid-cols-2">
        <SelectField name={name('productId')} label={t('record.product')} options={products.map(({ id, name: label }) => ({ value: id, label }))} empty={t('record.choose')} none={{ value: undefined }} />
        <SelectField name={name('freezerId')} label={t('record.freezer')} options={freezers.map(({ id, name: label }) => ({ value: id, label }))} empty={t('record.no-freezer')} none={{ value: null }} />
      </div>
      <div className="mt-3 grid grid-cols-2 gap-3 sm:grid-cols-3">
        <BagsField name={name('bags')} label={t('record.bags')} />
        <BagsField name={name('takenBack')} label={t('record.taken-back')} />
        <div className="col-span-2 sm:col-span-1">
          <TextField name={name('lot')} label={t('record.lot')} maxLength={40} />
        </div>
      </div>
    </div>
  );
}

function Total() {
  const { t } = useTranslation('deliveries');
  const { number } = useFormat();
  const lines = useWatch<Values, 'lines'>({ name: 'lines' });
  const count = lines.reduce((sum, { bags }) => sum + (Number(bags) || 0), 0);
  return <p role="status">{t('record.total', { bags: t('bags', { count, bags: number(count) }) })}</p>;
}
