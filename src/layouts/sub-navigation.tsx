import { NavLink } from 'react-router-dom';

interface Props {
  label: string;
  pages: { to: string; name: string }[];
}

/** The way between pages that belong together. */
export const SubNavigation = ({ label, pages }: Props) => (
  <nav aria-label={label} className="mt-3 mb-5 flex flex-wrap gap-x-5 border-b border-rule">
    {pages.map(({ to, name }) => (
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
