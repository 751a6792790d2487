import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { useNavigate } from 'react-router-dom';
import type { Result } from '../../../server/contract/endpoint';
import { api } from '../../../server/contract/index';
import type { StorePage } from '../../../server/contract/stores';
import { addDays, dayOf } from '../../../server/domain/civil';
import { page } from '../../api/page';
import { Form } from '../../form/form';
import { SubmitButton } from '../../form/submit-button';
import { TextField } from '../../form/text-field';
import { useContractForm } from '../../form/use-contract-form';
import { useMembership } from '../../lib/me';
import { PageTitle } from '../../layouts/page-title';
import { paths } from '../../paths';
import { Allowed } from '../stores/allowed';
import { StoreFrame } from '../stores/store-frame';
import { storeQuery } from '../stores/store-query';
import { BagsField } from './bags-field';
import { ClearTruck } from './clear-truck';
import { productsQuery } from './products-query';
import { timeOfDayIn } from './local-input';
import { TruckChanged, type Theirs } from './truck-changed';

export const nextTruckPage = page({
  queries: (place) => ({ found: storeQuery(place), listed: productsQuery(place) }),
  View: SetNextTruck,
});

type Products = Result<typeof api.products.list>['products'];

interface Props {
  found: StorePage;
  listed: { products: Products };
}

/** Dispatch says when the next truck comes, and with what. */
function SetNextTruck({ found, listed }: Props) {
  const { t } = useTranslation('deliveries');
  return (
    <StoreFrame store={found.store} narrow>
      <Allowed to="update" what="NextTruck" where={{ storeId: found.store.id }}>
        <PageTitle title={t('next-truck.title')} />
        <h1 className="text-title font-bold">{t('next-truck.title')}</h1>
        <p className="mt-1 text-ink-2">{t('next-truck.intro')}</p>
        <p className="text-small text-ink-3">{t('zone', { zone: found.store.timeZone })}</p>
        <TruckForm found={found} products={listed.products} />
        {found.nextTruck && <ClearTruck storeId={found.store.id} />}
      </Allowed>
    </StoreFrame>
  );
}

function TruckForm({ found, products }: { found: StorePage; products: Products }) {
  const { t } = useTranslation('deliveries');
  const navigate = useNavigate();
  const { slug } = useMembership().producer;
  const storeId = found.store.id;
  const [theirs, setTheirs] = useState<Theirs | null>(null);
  const form = useContractForm(api.deliveries.setNextTruck, {
    start: startOf(found, products),
    input: ({ load, ...body }) => ({
      params: { producer: slug, storeId },
      body: { ...body, version: theirs ? (theirs.truck?.version ?? null) : body.version, load: load.filter(({ bags }) => bags > 0) },
    }),
    stale: [api.stores.read, api.stores.list],
    onDone: () => void navigate(paths.store(slug, storeId)),
  });
  return (
    <Form form={form} className="mt-4">
      {form.problem?.type === 'truck-changed' && <TruckChanged problem={form.problem} theirs={theirs} onLearnt={setTheirs} zone={found.store.timeZone} />}
      <div className="grid grid-cols-2 gap-4 sm:grid-cols-3">
        <div className="col-span-2 sm:col-span-1">
          <TextField name="day" label={t('next-truck.day')} type="date" />
        </div>
        <TextField name="from" label={t('next-truck.from')} type="time" />
        <TextField name="to" label={t('next-truck.to')} type="time" />
      </div>
      <fieldset>
        <legend className="font-semibold">{t('next-truck.load')}</legend>
        {products.length === 0 && <p className="text-ink-2">{t('next-truck.no-products')}</p>}
        <div className="mt-2 grid grid-cols-2 gap-4 sm:grid-cols-3">
          {products.map(({ id, name }, i) => (
            <BagsField key={id} name={`load.${i}.bags`} label={name} />
          ))}
        </div>
      </fieldset>
      <SubmitButton>{t('next-truck.save')}</SubmitButton>
    </Form>
  );
}

/** What is set now, or tomorrow morning. */
function startOf({ store, nextTruck }: StorePage, products: Products) {
  const zone = store.timeZone;
  const today = dayOf(Date.now(), zone);
  return {
    day: nextTruck && nextTruck.day >= today ? nextTruck.day : addDays(today, 1),
    from: nextTruck ? timeOfDayIn(nextTruck.from, zone) : '08:00',
    to: nextTruck ? timeOfDayIn(nextTruck.to, zone) : '10:00',
    load: products.map(({ id }) => ({ productId: id, bags: nextTruck?.load.find(({ productId }) => productId === id)?.bags ?? 0 })),
    version: nextTruck?.version ?? null,
  };
}
