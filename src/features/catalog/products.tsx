import { useTranslation } from 'react-i18next';
import type { Result } from '../../../server/contract/endpoint';
import { api } from '../../../server/contract/index';
import type { Product } from '../../../server/contract/products';
import { useAct } from '../../api/act';
import { page } from '../../api/page';
import { RetireDialog } from '../../form/retire-dialog';
import { useFormat } from '../../lib/format';
import { useAbility, useMembership } from '../../lib/me';
import { CardTable } from '../../table/card-table';
import { Button } from '../../ui/button';
import { EmptyState } from '../../ui/states';
import { AccountsFrame } from '../accounts/accounts-frame';
import { Named } from '../accounts/named';
import { RowActs } from '../accounts/row-acts';
import { useListAct, type ListAct } from '../accounts/use-list-act';
import { productsQueryOf, productStale } from './catalog-queries';
import { ProductDialog } from './product-dialog';

export const productsPage = page({
  words: ['accounts', 'catalog', 'validation'],
  queries: ({ params }) => ({ listed: productsQueryOf(params.producer ?? '') }),
  View: Products,
});

/** The bags the producer fills. */
function Products({ listed: { products } }: { listed: Result<typeof api.products.list> }) {
  const { t } = useTranslation('catalog');
  const { slug } = useMembership().producer;
  const act = useListAct(products);
  const change = useAct(api.products.change, productStale);
  const add = useAbility().can('create', 'Product') && <Button onClick={() => act.start({ kind: 'add' })}>{t('products.add')}</Button>;
  return (
    <AccountsFrame title={t('products.title')} lead={t('products.lead')} action={add} done={act.done}>
      {products.length === 0 ? (
        <EmptyState title={t('products.empty')}>{t('products.empty-words')}</EmptyState>
      ) : (
        <ProductTable products={products} onAct={act.start} />
      )}
      <ProductDialog open={act.adding || act.changing !== null} product={act.changing} onClose={act.close} onDone={act.finish} />
      {act.retiring && (
        <RetireDialog
          thing={act.retiring}
          words={{ retire: t('products.retire'), restore: t('products.restore') }}
          send={(productId, body) => change.mutateAsync({ params: { producer: slug, productId }, body })}
          source={api.products.list}
          onClose={act.close}
          onDone={act.finish}
        />
      )}
    </AccountsFrame>
  );
}

function ProductTable({ products, onAct }: { products: Product[]; onAct: ListAct['start'] }) {
  const { t } = useTranslation(['catalog', 'accounts']);
  const format = useFormat();
  const change = useAbility().can('update', 'Product');
  const rows = products.map((product) => ({
    id: product.id,
    cells: [
      <Named key="name" {...product} />,
      format.bagPounds(product.bagPounds),
      product.gtin || t('products.no-gtin'),
      ...(change ? [<RowActs key="acts" of={product} onAct={onAct} />] : []),
    ],
  }));
  const columns = [t('products.product'), t('products.bag'), t('products.gtin'), ...(change ? [t('accounts:acts')] : [])];
  return <CardTable label={t('products.title')} columns={columns} rows={rows} />;
}
