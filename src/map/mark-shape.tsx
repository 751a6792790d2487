import type { TagShape } from '../ui/tag';

interface Props {
  shape: TagShape;
  /** Of the whole drawing, in pixels. */
  size: number;
  /** How many it stands for, where it is more than one. */
  count?: string;
}

/** A mark of a map in the current colour, with an edge that parts it from what lies below. */
export const MarkShape = ({ shape, size, count }: Props) => (
  <svg aria-hidden viewBox="-10 -10 20 20" width={size} height={size} className="overflow-visible">
    <path d={outlines[shape]} className="stroke-surface" strokeWidth="3" strokeLinejoin="round" fill="none" />
    {shape === 'ring' ? (
      <path d={outlines.ring} strokeWidth="2.4" stroke="currentColor" className="fill-surface" />
    ) : (
      <path d={outlines[shape]} fill="currentColor" />
    )}
    {count && (
      // The text keeps its size however large the shape is.
      <text
        textAnchor="middle"
        y={shape === 'triangle' ? 5.8 : 0}
        dy={shape === 'triangle' ? undefined : '.36em'}
        fontSize={(11.5 * 20) / size}
        className={`font-bold ${shape === 'ring' ? 'fill-straw' : 'fill-on'}`}
      >
        {count}
      </text>
    )}
  </svg>
);

const outlines: Record<TagShape, string> = {
  triangle: 'M0-9 9.5 8H-9.5Z',
  diamond: 'M0-9.6 9.6 0 0 9.6-9.6 0Z',
  ring: 'M0-7.2a7.2 7.2 0 1 1 0 14.4 7.2 7.2 0 0 1 0-14.4Z',
  dot: 'M0-7a7 7 0 1 1 0 14 7 7 0 0 1 0-14Z',
  square: 'M-7.5-7.5h15v15h-15Z',
};
