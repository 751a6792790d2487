import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import { row } from '../../../../server/contract/ability';
import type { FreezerPage } from '../../../../server/contract/freezers';
import { useAbility, useMembership } from '../../../lib/me';
import { paths } from '../../../paths';
import { linkClass } from '../../../ui/link-class';
import { Section } from '../../../ui/section';
import { RequestLinks } from '../../stores/request-links';

interface Props {
  found: FreezerPage;
  now: number;
}

/** What was asked to be fixed here, the youngest first. */
export function FreezerRequests({ found: { freezer, store, requests }, now }: Props) {
  const { t } = useTranslation('freezer-page');
  const { slug } = useMembership().producer;
  const mayFile = useAbility().can('create', row('Request', { storeId: store.id, kind: 'other' }));
  return (
    <Section title={t('requests.title')}>
      {requests.length === 0 ? (
        <p className="py-3 text-ink-2">{t('requests.none')}</p>
      ) : (
        <RequestLinks requests={requests} now={now} />
      )}
      {mayFile && (
        <Link to={paths.report(slug, store.id, freezer.id)} className={linkClass('big')}>
          {t('requests.file')}
        </Link>
      )}
    </Section>
  );
}
