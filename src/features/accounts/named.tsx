import { RetiredTag } from './retired-tag';

/** A row's name, and whether it is out of use. */
export const Named = ({ name, retired }: { name: string; retired: boolean }) => (
  <span className="flex flex-wrap items-center gap-x-3">
    {name}
    {retired && <RetiredTag />}
  </span>
);
