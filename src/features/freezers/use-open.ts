import { useSyncExternalStore } from 'react';
import { useNavigate, useSearchParams, type To } from 'react-router-dom';
import { useMembership } from '../../lib/me';
import { paths } from '../../paths';

export interface Open {
  /** The freezer named in the URL, whether or not there is room for it. */
  asked: string | null;
  /** The freezer that stands beside the list. */
  shown: string | null;
  /** Where a press on a freezer leads: beside the list, or to its own page where there is no room. */
  linkTo: (freezerId: string) => To;
  close: () => void;
}

export function useOpen(): Open {
  const { slug } = useMembership().producer;
  const [search] = useSearchParams();
  const navigate = useNavigate();
  const room = useRoomBeside();
  const asked = search.get('open');
  const withOpen = (freezerId: string | null) => {
    const wanted = new URLSearchParams(search);
    if (freezerId) wanted.set('open', freezerId);
    else wanted.delete('open');
    return { search: wanted.toString() };
  };
  const close = () => {
    void navigate(withOpen(null), { preventScrollReset: true });
    if (asked) document.querySelector<HTMLElement>(`[data-row="${CSS.escape(asked)}"]`)?.focus();
  };
  return {
    asked,
    shown: room ? asked : null,
    linkTo: (freezerId) => (room ? withOpen(freezerId) : paths.freezer(slug, freezerId)),
    close,
  };
}

/** Sections, a table and a pane stand side by side from here on. */
const enough = '(min-width: 80rem)';

function useRoomBeside(): boolean {
  return useSyncExternalStore(
    (changed) => {
      const media = matchMedia(enough);
      media.addEventListener('change', changed);
      return () => media.removeEventListener('change', changed);
    },
    () => matchMedia(enough).matches,
  );
}
