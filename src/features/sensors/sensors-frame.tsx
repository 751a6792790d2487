import type { ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import { NavLink } from 'react-router-dom';
import { PageTitle } from '../../layouts/page-title';
import { useAbility, useMembership } from '../../lib/me';
import { paths } from '../../paths';

interface Props {
  title: string;
  lead: string;
  children: ReactNode;
}

/** Around the three lists about sensors: the way from one to the next, and what this one says. */
export function SensorsFrame({ title, lead, children }: Props) {
  const { t } = useTranslation('sensors');
  return (
    <div className="px-4 py-5 lg:px-7 lg:py-6">
      <PageTitle title={title} />
      <h1 className="text-title font-bold">{t('title')}</h1>
      <Lists />
      <h2 className="text-lead font-bold">{title}</h2>
      <p className="mt-1 mb-4 max-w-prose text-ink-2">{lead}</p>
      {children}
    </div>
  );
}

function Lists() {
  const { t } = useTranslation('sensors');
  const { slug } = useMembership().producer;
  const keys = useAbility().can('read', 'TelemetryKey');
  const lists = [
    { to: paths.sensors(slug), name: t('unclaimed.title') },
    { to: paths.quarantinedReadings(slug), name: t('readings.title') },
    ...(keys ? [{ to: paths.telemetryKeys(slug), name: t('keys.title') }] : []),
  ];
  return (
    <nav aria-label={t('lists')} className="mt-3 mb-5 flex flex-wrap gap-x-5 border-b border-rule">
      {lists.map(({ to, name }) => (
        <NavLink
          key={to}
          to={to}
          end
          className="-mb-px inline-flex min-h-11 items-center border-b-3 border-transparent font-semibold text-ink-2 no-underline hover:text-ink aria-[current=page]:border-fjord aria-[current=page]:text-fjord"
        >
          {name}
        </NavLink>
      ))}
    </nav>
  );
}
