import type { RefObject } from 'react';
import { useTranslation } from 'react-i18next';
import { useNavigate } from 'react-router-dom';
import { useMembership } from '../../lib/me';
import { paths } from '../../paths';
import { ListKeys, rowAtHand } from '../../table/list-keys';
import type { Open } from './use-open';

interface Props {
  searchRef: RefObject<HTMLInputElement | null>;
  open: Open;
}

/** The list by keyboard; `o` opens a freezer on its own page. */
export function FleetKeys({ searchRef, open }: Props) {
  const { t } = useTranslation('freezers');
  const { slug } = useMembership().producer;
  const navigate = useNavigate();
  const openWhole = () => {
    const freezerId = rowAtHand()?.dataset.row;
    if (freezerId) void navigate(paths.freezer(slug, freezerId));
  };
  const names = { search: '/', move: '↑ ↓ k j', open: t('keys.enter'), whole: 'o', close: 'Esc', help: '?' };
  const help = (['search', 'move', 'open', 'whole', 'close', 'help'] as const).map((key) => ({ key: names[key], does: t(`keys.${key}`) }));
  return <ListKeys searchRef={searchRef} close={open.shown ? open.close : undefined} more={{ o: openWhole }} title={t('keys.title')} help={help} />;
}
