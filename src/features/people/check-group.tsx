interface Item {
  id: string;
  name: string;
  detail?: string;
}

interface Props {
  legend: string;
  /** Said where there is nothing to choose. */
  none?: string;
  items: Item[];
  chosen: string[];
  onToggle: (id: string) => void;
}

/** Any number of a few. */
export const CheckGroup = ({ legend, none, items, chosen, onToggle }: Props) => (
  <fieldset>
    <legend className="text-body font-semibold text-ink-2">{legend}</legend>
    {items.length === 0 && <p className="text-ink-3">{none}</p>}
    <ul className="mt-1 grid gap-x-4 sm:grid-cols-2">
      {items.map(({ id, name, detail }) => (
        <li key={id}>
          <label className="flex min-h-11 cursor-pointer items-center gap-3 py-1">
            <input type="checkbox" checked={chosen.includes(id)} onChange={() => onToggle(id)} className="size-5 shrink-0 accent-fjord" />
            <span className="min-w-0 wrap-anywhere">
              {name}
              {detail && <span className="block text-small text-ink-3">{detail}</span>}
            </span>
          </label>
        </li>
      ))}
    </ul>
  </fieldset>
);
