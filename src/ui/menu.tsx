import { useEffect, useRef, type FocusEvent, type KeyboardEvent, type MouseEvent, type ReactNode, type RefObject } from 'react';

interface Props {
  /** The button's name where what it shows is not enough; it then holds the shown words too. */
  label?: string;
  trigger: ReactNode;
  align?: 'left' | 'right';
  /** Opens above its button, at the foot of a page. */
  upward?: boolean;
  children: ReactNode;
}

/** A button that opens a short list of links and buttons: Enter or Space opens, arrows move, Esc closes and gives focus back. */
export function Menu({ label, trigger, align = 'right', upward = false, children }: Props) {
  const box = useRef<HTMLDetailsElement>(null);
  const close = () => {
    if (box.current) box.current.open = false;
  };
  usePressOutside(box, close);
  const onKeyDown = (event: KeyboardEvent) => {
    if (!box.current?.open) return;
    if (event.key === 'ArrowDown' || event.key === 'ArrowUp') {
      event.preventDefault();
      moveFocus(box.current, event.key === 'ArrowDown' ? 1 : -1);
    }
    if (event.key !== 'Escape') return;
    event.stopPropagation();
    close();
    box.current.querySelector('summary')?.focus();
  };
  const onBlur = ({ relatedTarget }: FocusEvent) => {
    if (relatedTarget instanceof Node && !box.current?.contains(relatedTarget)) close();
  };
  const onChosen = ({ target }: MouseEvent) => {
    if (target instanceof Element && target.closest('[data-menu-item]')) close();
  };
  return (
    <details ref={box} className="group relative" onKeyDown={onKeyDown} onBlur={onBlur}>
      <summary
        aria-label={label}
        className="flex min-h-11 list-none items-center gap-2 rounded-control px-2 text-ink-2 group-open:bg-sunk hover:bg-sunk [&::-webkit-details-marker]:hidden"
      >
        {trigger}
      </summary>
      <div
        onClick={onChosen}
        className={`absolute z-40 w-64 max-w-[calc(100vw-2rem)] rounded-card border border-edge bg-surface p-1.5 text-ink shadow-lg ${align === 'right' ? 'right-0' : 'left-0'} ${upward ? 'bottom-full mb-1' : 'top-full mt-1'}`}
      >
        {children}
      </div>
    </details>
  );
}

/** For a link or button in the menu, beside `menuItem`: `<Link {...menuItem} to=…>`. */
export const menuItem = {
  'data-menu-item': '',
  className: 'flex min-h-11 w-full items-center gap-2 rounded-control px-3 text-left hover:bg-sunk aria-[current=true]:bg-fjord-tint aria-[current=true]:text-fjord',
};

/** To the next item or the one before, round the ends; from the button, to the first or last. */
function moveFocus(menu: HTMLElement, step: 1 | -1) {
  const items = [...menu.querySelectorAll<HTMLElement>('[data-menu-item]')];
  const at = items.findIndex((item) => item === document.activeElement);
  const next = at < 0 && step < 0 ? -1 : at + step;
  items.at(next % items.length)?.focus();
}

function usePressOutside(box: RefObject<HTMLElement | null>, act: () => void) {
  useEffect(() => {
    const press = ({ target }: PointerEvent) => {
      if (target instanceof Node && !box.current?.contains(target)) act();
    };
    document.addEventListener('pointerdown', press);
    return () => document.removeEventListener('pointerdown', press);
  });
}
