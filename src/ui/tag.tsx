import type { ReactNode } from 'react';

export type TagTone = 'quiet' | 'fjord' | 'ember' | 'rust' | 'straw' | 'kelp';
/** As on the map: runs out first, warm, silent, fine, plant. */
export type TagShape = 'triangle' | 'diamond' | 'ring' | 'dot' | 'square';

interface Props {
  tone?: TagTone;
  shape?: TagShape;
  children: ReactNode;
}

/** A few words on how something stands; they never wrap, and a shape goes with the colour where many stand in a list. */
export const Tag = ({ tone = 'quiet', shape, children }: Props) => (
  <span className={`inline-flex max-w-full items-center gap-1.5 rounded-tag px-[7px] py-0.5 text-small font-semibold whitespace-nowrap ${tones[tone]}`}>
    {shape && <Shape shape={shape} />}
    {children}
  </span>
);

const Shape = ({ shape }: { shape: TagShape }) => (
  <svg viewBox="0 0 10 10" aria-hidden className="size-2.5 shrink-0" fill="currentColor">
    {shape === 'ring' ? <circle cx="5" cy="5" r="3.6" fill="none" stroke="currentColor" strokeWidth="1.8" /> : <path d={outlines[shape]} />}
  </svg>
);

const outlines: Record<Exclude<TagShape, 'ring'>, string> = {
  triangle: 'M5 .8 9.6 9H.4Z',
  diamond: 'M5 .2 9.8 5 5 9.8.2 5Z',
  dot: 'M5 1.2a3.8 3.8 0 1 1 0 7.6 3.8 3.8 0 0 1 0-7.6Z',
  square: 'M1.2 1.2h7.6v7.6H1.2Z',
};

const tones: Record<TagTone, string> = {
  quiet: 'bg-sunk text-ink-2',
  fjord: 'bg-fjord-tint text-fjord',
  ember: 'bg-ember-tint text-ember',
  rust: 'bg-rust-tint text-rust',
  straw: 'bg-straw-tint text-straw',
  kelp: 'bg-sunk text-kelp',
};
