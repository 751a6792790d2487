import type { ReactNode } from 'react';

interface Props {
  items: { term: string; detail: ReactNode }[];
}

/** Facts by name. */
export const DefinitionList = ({ items }: Props) => (
  <dl className="divide-y divide-rule">
    {items.map(({ term, detail }) => (
      <div key={term} className="flex flex-wrap justify-between gap-x-4 gap-y-0.5 py-2.5">
        <dt className="text-ink-2">{term}</dt>
        <dd className="font-semibold">{detail}</dd>
      </div>
    ))}
  </dl>
);
