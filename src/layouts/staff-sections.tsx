import { ChartNoAxesColumn, Ellipsis, MessagesSquare, Radio, Settings, Snowflake, Store, Truck, Users, Wallet, type LucideIcon } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import { NavLink } from 'react-router-dom';
import type { Ability, Action, Subject } from '../../server/contract/ability';
import { useAbility } from '../lib/me';
import { paths } from '../paths';
import { Menu, menuItem } from '../ui/menu';

interface Section {
  key: 'freezers' | 'stores' | 'trucks' | 'service' | 'comparison' | 'accounts' | 'sensors' | 'people' | 'settings';
  Icon: LucideIcon;
  to: (slug: string) => string;
  /** Only for those who may do one of these. */
  may?: [Action, Subject][];
}

const sections: Section[] = [
  { key: 'freezers', Icon: Snowflake, to: (slug) => paths.freezers(slug), may: [['read', 'Sensor']] },
  { key: 'stores', Icon: Store, to: (slug) => paths.stores(slug) },
  { key: 'trucks', Icon: Truck, to: (slug) => paths.trucks(slug), may: [['update', 'NextTruck']] },
  { key: 'service', Icon: MessagesSquare, to: (slug) => paths.requests(slug) },
  { key: 'comparison', Icon: ChartNoAxesColumn, to: (slug) => paths.comparison(slug), may: [['update', 'Event'], ['update', 'Plan']] },
  { key: 'accounts', Icon: Wallet, to: (slug) => paths.accounts(slug), may: [['read', 'Account']] },
  { key: 'sensors', Icon: Radio, to: (slug) => paths.sensors(slug), may: [['read', 'Sensor']] },
  { key: 'people', Icon: Users, to: (slug) => paths.people(slug), may: [['read', 'Person']] },
  { key: 'settings', Icon: Settings, to: (slug) => paths.settings(slug), may: [['read', 'Settings']] },
];

const allows = (ability: Ability, { may }: Section): boolean => !may || may.some(([action, subject]) => ability.can(action, subject));

/** As many as fit at the foot of a phone beside the way to the others. */
const AT_FOOT = 3;

/** The sections a member may see: a column on a desk, the foot of the page on a phone. */
export function StaffSections({ slug }: { slug: string }) {
  const { t } = useTranslation();
  const ability = useAbility();
  const shown = sections.filter((section) => allows(ability, section));
  const folded = shown.length > AT_FOOT + 1 ? shown.slice(AT_FOOT) : [];
  return (
    <nav
      aria-label={t('nav.label')}
      className="fixed inset-x-0 bottom-0 z-30 grid auto-cols-fr grid-flow-col border-t border-rule bg-surface pb-[env(safe-area-inset-bottom)] lg:static lg:flex lg:flex-col lg:gap-0.5 lg:border-0 lg:pb-0"
    >
      {shown.map((section) => (
        <SectionLink key={section.key} section={section} slug={slug} folded={folded.includes(section)} />
      ))}
      {folded.length > 0 && <More sections={folded} slug={slug} />}
    </nav>
  );
}

interface LinkProps {
  section: Section;
  slug: string;
  /** Not at the foot of a phone. */
  folded: boolean;
}

function SectionLink({ section: { key, Icon, to }, slug, folded }: LinkProps) {
  const { t } = useTranslation();
  return (
    <NavLink
      to={to(slug)}
      className={`${folded ? 'hidden lg:flex' : 'flex'} min-h-14 min-w-0 flex-col items-center justify-center gap-0.5 text-[11px] font-semibold text-ink-2 min-[380px]:text-small aria-[current=page]:bg-fjord-tint aria-[current=page]:text-fjord lg:min-h-10 lg:flex-row lg:justify-start lg:gap-2.5 lg:rounded-control lg:px-2.5 lg:text-body`}
    >
      <Icon aria-hidden size={18} strokeWidth={1.8} />
      <span className="max-w-full truncate">{t(`nav.${key}`)}</span>
    </NavLink>
  );
}

function More({ sections: list, slug }: { sections: Section[]; slug: string }) {
  const { t } = useTranslation();
  const trigger = (
    <span className="flex min-h-14 w-full flex-col items-center justify-center gap-0.5 text-[11px] font-semibold min-[380px]:text-small">
      <Ellipsis aria-hidden size={18} strokeWidth={1.8} />
      {t('nav.more')}
    </span>
  );
  return (
    <div className="[&_summary]:justify-center [&_summary]:p-0 lg:hidden">
      <Menu trigger={trigger} upward>
        {list.map(({ key, Icon, to }) => (
          <NavLink key={key} {...menuItem} to={to(slug)}>
            <Icon aria-hidden size={18} strokeWidth={1.8} />
            {t(`nav.${key}`)}
          </NavLink>
        ))}
      </Menu>
    </div>
  );
}
