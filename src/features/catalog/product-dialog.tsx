import { useTranslation } from 'react-i18next';
import { api } from '../../../server/contract/index';
import type { Product } from '../../../server/contract/products';
import { queryClient } from '../../api/query';
import type { NamedField } from '../../form/changed-meanwhile';
import { Form } from '../../form/form';
import { NumberField } from '../../form/number-field';
import { SubmitButton } from '../../form/submit-button';
import { TextField } from '../../form/text-field';
import { useContractForm } from '../../form/use-contract-form';
import { useFormat } from '../../lib/format';
import { useMembership } from '../../lib/me';
import { Dialog } from '../../ui/dialog';
import { newestOf } from '../accounts/newest-of';
import { productsQueryOf, productStale } from './catalog-queries';

interface Props {
  open: boolean;
  /** Null for a new one. */
  product: Product | null;
  onClose: () => void;
  onDone: (words: string) => void;
}

export function ProductDialog({ open, product, onClose, onDone }: Props) {
  const { t } = useTranslation(['catalog', 'accounts', 'common']);
  const title = product ? t('accounts:change.title', { name: product.name }) : t('products.add');
  return (
    <Dialog open={open} title={title} onClose={onClose} closeLabel={t('common:close')}>
      {product ? <Change product={product} onDone={onDone} /> : <Add onDone={onDone} />}
    </Dialog>
  );
}

function Add({ onDone }: Pick<Props, 'onDone'>) {
  const { t } = useTranslation('accounts');
  const { slug } = useMembership().producer;
  const form = useContractForm(api.products.create, {
    start: { name: '', gtin: '' },
    input: (body) => ({ params: { producer: slug }, body }),
    stale: productStale,
    onDone: ({ name }) => onDone(t('added', { name })),
  });
  return (
    <Form form={form}>
      <Fields />
      <SubmitButton>{t('add')}</SubmitButton>
    </Form>
  );
}

const enteredOf = ({ name, bagPounds, gtin, version }: Product) => ({ name, bagPounds, gtin, version });
type Entered = ReturnType<typeof enteredOf>;

function Change({ product, onDone }: Pick<Props, 'onDone'> & { product: Product }) {
  const { t } = useTranslation('accounts');
  const { slug } = useMembership().producer;
  const form = useContractForm(api.products.change, {
    start: enteredOf(product),
    input: (body) => ({ params: { producer: slug, productId: product.id }, body }),
    stale: productStale,
    onDone: ({ name }) => onDone(t('saved', { name })),
  });
  const newest = async () => enteredOf(newestOf((await queryClient.fetchQuery({ ...productsQueryOf(slug), staleTime: 0 })).products, product.id));
  return (
    <Form form={form} meanwhile={{ fields: useProductFields(), onNewest: newest }}>
      <Fields />
      <SubmitButton>{t('save')}</SubmitButton>
    </Form>
  );
}

function Fields() {
  const { t } = useTranslation('catalog');
  return (
    <>
      <TextField name="name" label={t('name')} hint={t('products.name-hint')} maxLength={80} autoComplete="off" autoFocus />
      <NumberField name="bagPounds" label={t('products.bag-pounds')} hint={t('products.bag-hint')} />
      <TextField name="gtin" label={t('products.gtin')} hint={t('products.gtin-hint')} inputMode="numeric" maxLength={24} autoComplete="off" />
    </>
  );
}

/** The fields by the names people see, for saying what somebody else changed. */
function useProductFields(): NamedField<Entered>[] {
  const { t } = useTranslation('catalog');
  const { tenths } = useFormat();
  return [
    { name: 'name', label: t('name'), said: ({ name }) => name },
    { name: 'bagPounds', label: t('products.bag-pounds'), said: ({ bagPounds }) => tenths(bagPounds) },
    { name: 'gtin', label: t('products.gtin'), said: ({ gtin }) => gtin || t('products.no-gtin') },
  ];
}
