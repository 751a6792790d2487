import { useEffect, useEffectEvent, useState, type RefObject } from 'react';
import { useTranslation } from 'react-i18next';
import { Dialog } from '../../ui/dialog';

interface Props {
  searchRef: RefObject<HTMLInputElement | null>;
  /** Closes the open request; absent while none is. */
  close?: () => void;
}

/** The list by keyboard: `/` searches, arrows move, Enter opens (a link does by itself), Esc closes, `?` tells. */
export function QueueKeys({ searchRef, close }: Props) {
  const { t } = useTranslation(['requests', 'common']);
  const [help, showHelp] = useState(false);

  const keys: Record<string, (() => void) | undefined> = {
    '/': () => searchRef.current?.focus(),
    '?': () => showHelp(true),
    ArrowDown: () => moveBy(1),
    ArrowUp: () => moveBy(-1),
    Escape: close,
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
    <Dialog open={help} title={t('keys.title')} onClose={() => showHelp(false)} closeLabel={t('common:close')}>
      <dl className="grid grid-cols-[auto_1fr] gap-x-6 gap-y-2">
        {(['search', 'move', 'open', 'close', 'help'] as const).map((key) => (
          <div key={key} className="contents">
            <dt>
              <kbd className="rounded-tag bg-sunk px-2 py-0.5 font-semibold">{t(`keys.names.${key}`)}</kbd>
            </dt>
            <dd>{t(`keys.${key}`)}</dd>
          </div>
        ))}
      </dl>
    </Dialog>
  );
}

function moveBy(step: 1 | -1) {
  const rows = [...document.querySelectorAll<HTMLElement>('[data-row]')];
  const here = rows.findIndex((row) => row === document.activeElement);
  const start = here === -1 ? rows.findIndex((row) => row.ariaCurrent === 'true') : here;
  const to = start === -1 ? 0 : start + step;
  rows[Math.max(0, Math.min(rows.length - 1, to))]?.focus();
}

const isTyping = (target: EventTarget | null): boolean =>
  target instanceof HTMLElement && (target.isContentEditable || ['INPUT', 'TEXTAREA', 'SELECT'].includes(target.tagName));
