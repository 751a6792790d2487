interface Option {
  value: string;
  label: string;
}

/** What is chosen now stays a choice, even where it can no longer be chosen elsewhere. */
export const withNow = (options: Option[], now: string | undefined, label: string): Option[] =>
  now === undefined || options.some(({ value }) => value === now) ? options : [{ value: now, label }, ...options];
