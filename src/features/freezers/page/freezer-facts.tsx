import { useTranslation } from 'react-i18next';
import type { Freezer } from '../../../../server/contract/freezers';
import { useFormat } from '../../../lib/format';
import { DefinitionList } from '../../../ui/definition-list';
import { Section } from '../../../ui/section';

/** What the freezer is: its model, its measures, how its width is shared. */
export function FreezerFacts({ freezer: { model, mount, lanes, placement, condition, assetNumber } }: { freezer: Freezer }) {
  const { t } = useTranslation('freezer-page');
  const { inches, pounds, percent, number } = useFormat();
  const items = [
    { term: t('facts.asset'), detail: assetNumber },
    { term: t('facts.model'), detail: model.name },
    {
      term: t('facts.inside'),
      detail: t('facts.measures', { width: inches(model.insideWidthIn), depth: inches(model.insideDepthIn), height: inches(model.insideHeightIn) }),
    },
    { term: t('facts.doors'), detail: number(model.doors) },
    { term: t('facts.rated'), detail: pounds(model.ratedPounds) },
    { term: t('facts.defrost'), detail: t(`defrosts.${model.defrost}`) },
    {
      term: t('facts.lanes'),
      detail: (
        <ul className="text-right">
          {lanes.map(({ product, widthShare }, i) => (
            <li key={i}>{t('facts.lane', { product, share: percent(widthShare) })}</li>
          ))}
        </ul>
      ),
    },
    { term: t('facts.channel-drop'), detail: inches(mount.channelDropIn) },
    { term: t('facts.rack'), detail: inches(mount.rackIn) },
    { term: t('facts.headroom'), detail: inches(mount.headroomIn) },
    { term: t('facts.placement'), detail: t(`placements.${placement}`) },
    { term: t('facts.condition'), detail: condition || t('facts.no-condition') },
  ];
  return (
    <Section title={t('facts.title')}>
      <DefinitionList items={items} />
    </Section>
  );
}
