import { useTranslation } from 'react-i18next';
import type { Result } from '../../../server/contract/endpoint';
import { api } from '../../../server/contract/index';
import type { FreezerModel } from '../../../server/contract/models';
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
import { modelsQueryOf, modelStale } from './catalog-queries';
import { ModelDialog } from './model-dialog';

export const modelsPage = page({
  words: ['accounts', 'catalog', 'validation'],
  queries: ({ params }) => ({ listed: modelsQueryOf(params.producer ?? '') }),
  View: Models,
});

/** The types of freezer, whose measures turn distances into bags. */
function Models({ listed: { models } }: { listed: Result<typeof api.models.list> }) {
  const { t } = useTranslation('catalog');
  const { slug } = useMembership().producer;
  const act = useListAct(models);
  const change = useAct(api.models.change, modelStale);
  const add = useAbility().can('create', 'Model') && <Button onClick={() => act.start({ kind: 'add' })}>{t('models.add')}</Button>;
  return (
    <AccountsFrame title={t('models.title')} lead={t('models.lead')} action={add} done={act.done}>
      {models.length === 0 ? (
        <EmptyState title={t('models.empty')}>{t('models.empty-words')}</EmptyState>
      ) : (
        <ModelTable models={models} onAct={act.start} />
      )}
      <ModelDialog open={act.adding || act.changing !== null} model={act.changing} onClose={act.close} onDone={act.finish} />
      {act.retiring && (
        <RetireDialog
          thing={act.retiring}
          words={{ retire: t('models.retire'), restore: t('models.restore') }}
          needed={act.retiring.freezers > 0 ? t('models.needed', { count: act.retiring.freezers }) : null}
          send={(modelId, body) => change.mutateAsync({ params: { producer: slug, modelId }, body })}
          source={api.models.list}
          onClose={act.close}
          onDone={act.finish}
        />
      )}
    </AccountsFrame>
  );
}

function ModelTable({ models, onAct }: { models: FreezerModel[]; onAct: ListAct['start'] }) {
  const { t } = useTranslation(['catalog', 'accounts']);
  const { number, inches, pounds } = useFormat();
  const change = useAbility().can('update', 'Model');
  const rows = models.map((model) => ({
    id: model.id,
    cells: [
      <Named key="name" {...model} />,
      t('models.inside-measures', { width: inches(model.insideWidthIn), depth: inches(model.insideDepthIn), height: inches(model.insideHeightIn) }),
      number(model.doors),
      pounds(model.ratedPounds),
      t(`models.defrosts.${model.defrost}`),
      number(model.freezers),
      ...(change ? [<RowActs key="acts" of={model} onAct={onAct} />] : []),
    ],
  }));
  const named = [t('models.model'), t('models.inside'), t('models.doors'), t('models.rated'), t('models.defrost'), t('models.freezers')];
  return <CardTable label={t('models.title')} columns={[...named, ...(change ? [t('accounts:acts')] : [])]} rows={rows} />;
}
