import type { ReactNode } from 'react';
import { useQuery } from '@tanstack/react-query';
import { useTranslation } from 'react-i18next';
import { Link, NavLink, useParams } from 'react-router-dom';
import type { Membership } from '../../server/contract/auth';
import { api } from '../../server/contract/index';
import { q } from '../api/query';
import { paths } from '../paths';
import { KeptLanguageSwitch } from './kept-language-switch';
import { landingOf } from './landing';
import { Brand } from '../ui/brand';
import { PersonMenu } from './person-menu';
import { ProducerName } from './producer-name';

interface Props {
  member: Membership;
  children: ReactNode;
}

/** Around the pages of the stores' people: one bar on top, phone first. */
export function StoreLayout({ member, children }: Props) {
  return (
    <div className="mx-auto max-w-[1160px]">
      <header className="flex items-center gap-3 px-4 py-3 sm:px-6">
        <Link to={landingOf(member)} className="rounded-control">
          <Brand />
        </Link>
        <Supplier member={member} />
        <div className="ml-auto flex items-center gap-2 sm:gap-3">
          <KeptLanguageSwitch />
          <PersonMenu />
        </div>
      </header>
      <Sections member={member} />
      <main id="main" tabIndex={-1} className="px-4 pt-2 pb-12 outline-none sm:px-6">
        {children}
      </main>
    </div>
  );
}

/** Whose ice, for whom: known once the store's page is. */
function Supplier({ member }: { member: Membership }) {
  const { t } = useTranslation();
  const { storeId } = useParams();
  const producer = member.producer.slug;
  const { data } = useQuery({
    ...q(api.stores.read, { params: { producer, storeId: storeId ?? '' } }),
    enabled: storeId !== undefined,
  });
  const { name } = member.producer;
  const shown = data ? t('producer-for', { producer: name, store: data.store.account }) : name;
  return (
    <div className="hidden border-l border-edge pl-3 md:block">
      <ProducerName producer={{ ...member.producer, name: shown }} />
    </div>
  );
}

function Sections({ member }: { member: Membership }) {
  const { t } = useTranslation();
  const { slug } = member.producer;
  const [only, ...more] = member.storeIds;
  const store = only && more.length === 0 ? only : null;
  return (
    <nav aria-label={t('nav.label')} className="flex gap-1 px-2 sm:px-4">
      <SectionLink to={store ? paths.store(slug, store) : paths.stores(slug)} label={store ? t('nav.store') : t('nav.stores')} />
      <SectionLink to={paths.requests(slug)} label={t('nav.requests')} />
      {member.role === 'district-rep' && <SectionLink to={paths.comparison(slug)} label={t('nav.comparison')} />}
    </nav>
  );
}

const SectionLink = ({ to, label }: { to: string; label: string }) => (
  <NavLink
    to={to}
    className="inline-flex min-h-11 items-center rounded-control px-3 text-body font-semibold text-ink-2 aria-[current=page]:text-fjord aria-[current=page]:underline aria-[current=page]:decoration-2 aria-[current=page]:underline-offset-8"
  >
    {label}
  </NavLink>
);
