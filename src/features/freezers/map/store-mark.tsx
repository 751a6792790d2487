import { Link } from 'react-router-dom';
import { useFormat } from '../../../lib/format';
import { useMembership } from '../../../lib/me';
import { MarkShape } from '../../../map/mark-shape';
import { paths } from '../../../paths';
import { looks, type DrawnMark } from './drawn-stores';
import type { StoreSaid } from './use-store-said';

interface Props {
  mark: DrawnMark;
  said: StoreSaid;
  lit: boolean;
  onLight: (ids: string[]) => void;
  onOpen: (mark: DrawnMark) => void;
}

/** One store, which leads to its page, or several under the worst of them, which the map then shows apart. */
export function StoreMark({ mark, said, lit, onLight, onOpen }: Props) {
  const { slug } = useMembership().producer;
  const { number } = useFormat();
  const { worst, stores, x, y } = mark;
  const { shape, colour } = looks[worst.mark];
  const count = stores.length > 1 ? number(stores.length) : undefined;
  const light = () => onLight(stores.map(({ id }) => id));
  const dark = () => onLight([]);
  const control = {
    className: `grid size-8 place-items-center rounded-full ${colour} ${lit ? 'bg-surface outline-2 outline-ink' : ''}`,
    onPointerEnter: light,
    onPointerLeave: dark,
    onFocus: light,
    onBlur: dark,
  };
  return (
    <li className={`absolute -translate-1/2 ${lit ? 'z-10' : ''}`} style={{ left: x, top: y }}>
      {count ? (
        <button {...control} type="button" aria-label={said.together(mark)} onClick={() => onOpen(mark)}>
          <MarkShape shape={shape} size={26 + 5 * count.length} count={count} />
        </button>
      ) : (
        <Link {...control} to={paths.store(slug, worst.id)} aria-label={said.store(worst)}>
          <MarkShape shape={shape} size={17} />
        </Link>
      )}
    </li>
  );
}
