import type { ReactNode } from 'react';
import { Notice } from '../ui/notice';
import { PageTitle } from './page-title';
import { SubNavigation } from './sub-navigation';

interface Props {
  /** Of all the lists. */
  heading: string;
  label: string;
  lists: { to: string; name: string }[];
  title: string;
  lead: string;
  /** The way to one more, for those who may. */
  action?: ReactNode;
  /** What was just done. */
  done?: string | null;
  children: ReactNode;
}

/** Around one of several lists: the way from one to the next, and what this one says. */
export const ListsFrame = ({ heading, label, lists, title, lead, action, done, children }: Props) => (
  <div className="px-4 py-5 lg:px-7 lg:py-6">
    <PageTitle title={title} />
    <h1 className="text-title font-bold">{heading}</h1>
    <SubNavigation label={label} pages={lists} />
    <div className="mb-4 flex flex-wrap items-start justify-between gap-3">
      <div>
        <h2 className="text-lead font-bold">{title}</h2>
        <p className="mt-1 max-w-prose text-ink-2">{lead}</p>
      </div>
      {action}
    </div>
    <div role="status" className="mb-4 empty:hidden">
      {done && <Notice tone="good" title={done} />}
    </div>
    {children}
  </div>
);

export type ListOf = Pick<Props, 'title' | 'lead' | 'action' | 'done' | 'children'>;
