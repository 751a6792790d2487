interface Props {
  label: string;
  items: { id: string; title: string; hint: string }[];
  onPick: (id: string) => void;
}

/** What was found, each a large button: a press picks, the arrows do not. */
export const PickList = ({ label, items, onPick }: Props) => (
  <ul aria-label={label} className="grid gap-2">
    {items.map(({ id, title, hint }) => (
      <li key={id}>
        <button
          type="button"
          onClick={() => onPick(id)}
          className="min-h-14 w-full rounded-card border border-edge bg-surface px-4 py-2.5 text-left hover:border-fjord hover:bg-fjord-tint"
        >
          <span className="block font-semibold wrap-anywhere text-fjord">{title}</span>
          <span className="block text-small text-ink-2">{hint}</span>
        </button>
      </li>
    ))}
  </ul>
);
