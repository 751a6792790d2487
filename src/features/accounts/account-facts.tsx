import { useTranslation } from 'react-i18next';
import type { Account } from '../../../server/contract/accounts';
import { useFormat } from '../../lib/format';
import { DefinitionList } from '../../ui/definition-list';

export function AccountFacts({ account: { number, terms, language, stores } }: { account: Account }) {
  const { t } = useTranslation(['accounts', 'common']);
  const format = useFormat();
  const facts = [
    { term: t('number'), detail: number },
    { term: t('terms'), detail: terms || t('none-said') },
    { term: t('common:language.label'), detail: t(`common:language.${language}`) },
    { term: t('stores.title'), detail: format.number(stores) },
  ];
  return (
    <section aria-labelledby="facts">
      <h2 id="facts" className="text-lead font-bold">
        {t('facts')}
      </h2>
      <DefinitionList items={facts} />
    </section>
  );
}
