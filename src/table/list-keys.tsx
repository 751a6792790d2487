import { useEffect, useEffectEvent, useState, type RefObject } from 'react';
import { useTranslation } from 'react-i18next';
import { Dialog } from '../ui/dialog';

interface Props {
  searchRef: RefObject<HTMLInputElement | null>;
  /** Closes what is open beside the list; absent while nothing is. */
  close?: () => void;
  /** Keys of this list alone. */
  more?: Record<string, () => void>;
  title: string;
  help: { key: string; does: string }[];
}

/**
 * A list by keyboard: `/` searches, arrows (or `j` and `k`) move, Enter opens (a link does by itself), Esc closes, `?` tells.
 * What they move along are the elements with `data-row`.
 */
export function ListKeys({ searchRef, close, more, title, help }: Props) {
  const { t } = useTranslation();
  const [told, tell] = useState(false);

  const down = () => moveBy(1);
  const up = () => moveBy(-1);
  const keys: Record<string, (() => void) | undefined> = {
    '/': () => searchRef.current?.focus(),
    '?': () => tell(true),
    ArrowDown: down,
    j: down,
    ArrowUp: up,
    k: up,
    Escape: close,
    ...more,
  };
  const press = useEffectEvent((event: KeyboardEvent) => {
    if (event.defaultPrevented || event.altKey || event.ctrlKey || event.metaKey || document.querySelector('dialog[open]')) return;
    const act = isTyping(event.target) ? undefined : keys[event.key];
    if (act) {
      event.preventDefault();
      act();
    } else if (event.key === 'Escape' && event.target === searchRef.current) {
      searchRef.current?.blur();
    }
  });
  useEffect(() => {
    const listener = (event: KeyboardEvent) => press(event);
    window.addEventListener('keydown', listener);
    return () => window.removeEventListener('keydown', listener);
  }, []);

  return (
    <Dialog open={told} title={title} onClose={() => tell(false)} closeLabel={t('close')}>
      <dl className="grid grid-cols-[auto_1fr] gap-x-6 gap-y-2">
        {help.map(({ key, does }) => (
          <div key={key} className="contents">
            <dt>
              <kbd className="rounded-tag bg-sunk px-2 py-0.5 font-semibold">{key}</kbd>
            </dt>
            <dd>{does}</dd>
          </div>
        ))}
      </dl>
    </Dialog>
  );
}

/** The row that has the focus, or the one that stands open. */
export function rowAtHand(): HTMLElement | undefined {
  const rows = rowsShown();
  return rows.find((row) => row === document.activeElement) ?? rows.find((row) => row.ariaCurrent === 'true');
}

function moveBy(step: 1 | -1) {
  const rows = rowsShown();
  const here = rowAtHand();
  const to = here ? rows.indexOf(here) + step : 0;
  rows[Math.max(0, Math.min(rows.length - 1, to))]?.focus();
}

const rowsShown = () => [...document.querySelectorAll<HTMLElement>('[data-row]')];

const isTyping = (target: EventTarget | null): boolean =>
  target instanceof HTMLElement && (target.isContentEditable || ['INPUT', 'TEXTAREA', 'SELECT'].includes(target.tagName));
