import { VisuallyHidden } from './visually-hidden';

export interface Segment<V extends string> {
  value: V;
  /** What is seen, such as "EN"; those who hear the page get both. */
  short: string;
  /** What it stands for, such as "English". */
  label: string;
  lang?: string;
}

interface Props<V extends string> {
  label: string;
  segments: readonly Segment<V>[];
  value: V;
  onChange: (value: V) => void;
}

/** Two or three choices that act at once. */
export const SegmentedControl = <V extends string>({ label, segments, value, onChange }: Props<V>) => (
  <div role="group" aria-label={label} className="flex w-fit overflow-hidden rounded-control border border-edge">
    {segments.map((segment) => (
      <button
        key={segment.value}
        type="button"
        lang={segment.lang}
        aria-pressed={segment.value === value}
        onClick={() => onChange(segment.value)}
        className="min-h-11 min-w-11 px-2.5 text-small font-semibold text-ink-2 -outline-offset-2 not-aria-pressed:hover:bg-sunk aria-pressed:bg-ink aria-pressed:text-paper aria-pressed:outline-paper"
      >
        {segment.short}
        {segment.label !== segment.short && <VisuallyHidden> {segment.label}</VisuallyHidden>}
      </button>
    ))}
  </div>
);
