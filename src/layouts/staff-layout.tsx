import type { ReactNode } from 'react';
import { History, MessagesSquare, Radio, Store, Users, type LucideIcon } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import { Link, NavLink } from 'react-router-dom';
import type { Subject } from '../../server/contract/ability';
import type { Membership } from '../../server/contract/auth';
import { useAbility } from '../lib/me';
import { paths } from '../paths';
import { KeptLanguageSwitch } from './kept-language-switch';
import { landingOf } from './landing';
import { Brand } from '../ui/brand';
import { PersonMenu } from './person-menu';

interface Props {
  member: Membership;
  children: ReactNode;
}

/** Around the pages of the producer's people: sections at the left, or along the bottom of a phone. */
export function StaffLayout({ member, children }: Props) {
  return (
    <div className="min-h-dvh lg:grid lg:grid-cols-[196px_minmax(0,1fr)]">
      <header className="flex items-center justify-between gap-3 border-b border-rule bg-surface px-4 py-2.5 lg:sticky lg:top-0 lg:h-dvh lg:flex-col lg:items-stretch lg:justify-start lg:border-r lg:border-b-0 lg:px-3.5 lg:py-5">
        <Link to={landingOf(member)} className="rounded-control lg:px-2 lg:pb-3">
          <Brand />
        </Link>
        <Sections slug={member.producer.slug} />
        <div className="flex items-center gap-2 lg:mt-auto lg:flex-col lg:items-start lg:gap-3 lg:px-2">
          <p className="hidden text-small text-ink-3 lg:block">{member.producer.name}</p>
          <KeptLanguageSwitch />
          <span className="lg:hidden">
            <PersonMenu />
          </span>
          <span className="hidden lg:-ml-2 lg:block">
            <PersonMenu upward />
          </span>
        </div>
      </header>
      <main id="main" tabIndex={-1} className="min-w-0 pb-20 outline-none lg:pb-0">
        {children}
      </main>
    </div>
  );
}

interface Section {
  key: 'stores' | 'service' | 'sensors' | 'people' | 'changes';
  Icon: LucideIcon;
  to: (slug: string) => string;
  /** Only for those who may read one of these. */
  reads?: Subject[];
}

const sections: Section[] = [
  { key: 'stores', Icon: Store, to: (slug) => paths.stores(slug) },
  { key: 'service', Icon: MessagesSquare, to: (slug) => paths.requests(slug) },
  { key: 'sensors', Icon: Radio, to: (slug) => paths.sensors(slug), reads: ['Sensor', 'TelemetryKey'] },
  { key: 'people', Icon: Users, to: (slug) => paths.people(slug), reads: ['Person'] },
  { key: 'changes', Icon: History, to: (slug) => paths.changes(slug), reads: ['Audit'] },
];

function Sections({ slug }: { slug: string }) {
  const { t } = useTranslation();
  const ability = useAbility();
  const shown = sections.filter(({ reads }) => !reads || reads.some((subject) => ability.can('read', subject)));
  return (
    <nav
      aria-label={t('nav.label')}
      className="fixed inset-x-0 bottom-0 z-30 grid auto-cols-fr grid-flow-col border-t border-rule bg-surface pb-[env(safe-area-inset-bottom)] lg:static lg:flex lg:flex-col lg:gap-0.5 lg:border-0 lg:pb-0"
    >
      {shown.map(({ key, Icon, to }) => (
        <NavLink
          key={key}
          to={to(slug)}
          className="flex min-h-14 flex-col items-center justify-center gap-0.5 text-small font-semibold text-ink-2 aria-[current=page]:bg-fjord-tint aria-[current=page]:text-fjord lg:min-h-10 lg:flex-row lg:justify-start lg:gap-2.5 lg:rounded-control lg:px-2.5 lg:text-body"
        >
          <Icon aria-hidden size={18} strokeWidth={1.8} />
          {t(`nav.${key}`)}
        </NavLink>
      ))}
    </nav>
  );
}
