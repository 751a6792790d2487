import type { ButtonSize } from './button';

/** The look of a link that stands by itself, as high as a button. */
export const linkClass = (size: ButtonSize = 'normal'): string =>
  `inline-flex ${size === 'big' ? 'min-h-12' : 'min-h-11'} items-center font-semibold text-fjord underline underline-offset-4`;
