import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { useNavigate } from 'react-router-dom';
import type { Result } from '../../../server/contract/endpoint';
import { api } from '../../../server/contract/index';
import type { StorePage } from '../../../server/contract/stores';
import { page } from '../../api/page';
import { Form } from '../../form/form';
import { SubmitButton } from '../../form/submit-button';
import { useContractForm } from '../../form/use-contract-form';
import { PageTitle } from '../../layouts/page-title';
import { useMembership } from '../../lib/me';
import { paths } from '../../paths';
import { Allowed } from '../stores/allowed';
import { StoreFrame } from '../stores/store-frame';
import { storeQuery } from '../stores/store-query';
import { DeliveryTime } from './delivery-time';
import { LineFields } from './line-fields';
import { productsQuery } from './products-query';

export const recordDeliveryPage = page({
  queries: (place) => ({ found: storeQuery(place), listed: productsQuery(place) }),
  View: RecordDelivery,
});

export type Products = Result<typeof api.products.list>['products'];

interface Props {
  found: StorePage;
  listed: { products: Products };
}

/** Dispatch records what a truck left behind. */
function RecordDelivery({ found, listed }: Props) {
  const { t } = useTranslation('deliveries');
  const navigate = useNavigate();
  const { slug } = useMembership().producer;
  const storeId = found.store.id;
  const [opened] = useState(Date.now);
  const form = useContractForm(api.deliveries.record, {
    start: { at: opened, lines: linesOf(found, listed.products) },
    input: (body) => ({
      params: { producer: slug, storeId },
      body: { ...body, lines: body.lines.filter(({ bags, takenBack }) => bags > 0 || takenBack > 0) },
    }),
    stale: [api.stores.read, api.stores.list, api.deliveries.list],
    onDone: () => void navigate(paths.store(slug, storeId)),
  });
  return (
    <StoreFrame store={found.store} narrow>
      <Allowed to="create" what="Delivery" where={{ storeId: found.store.id }}>
        <PageTitle title={t('record.title')} />
        <h1 className="text-title font-bold">{t('record.title')}</h1>
        <Form form={form} className="mt-4">
          <DeliveryTime zone={found.store.timeZone} />
          <LineFields products={listed.products} freezers={found.freezers} />
          <SubmitButton>{t('record.save')}</SubmitButton>
        </Form>
      </Allowed>
    </StoreFrame>
  );
}

/** A line for every lane of every freezer, so that the counts only need filling in. */
function linesOf({ freezers }: StorePage, products: Products) {
  const lanes = freezers.flatMap(({ id, lanes }) => lanes.map(({ productId }) => ({ productId, freezerId: id })));
  const all = lanes.length > 0 ? lanes : products.map(({ id }) => ({ productId: id, freezerId: null }));
  return all.map((line) => ({ ...line, bags: 0, takenBack: 0, lot: '' }));
}
