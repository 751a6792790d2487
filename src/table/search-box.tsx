import { useEffect, useState, type KeyboardEvent, type Ref } from 'react';
import { Search } from 'lucide-react';

interface Props {
  label: string;
  hint: string;
  value: string;
  onSearch: (words: string) => void;
  inputRef?: Ref<HTMLInputElement>;
}

const PAUSE_MS = 250;

/** Searches when the typing rests. */
export function SearchBox({ label, hint, value, onSearch, inputRef }: Props) {
  const [words, setWords] = useState(value);
  const [shown, setShown] = useState(value);
  // The URL may change from elsewhere: back, or the filters cleared.
  if (shown !== value) {
    setShown(value);
    setWords(value);
  }
  useEffect(() => {
    if (words.trim() === value) return;
    const timer = setTimeout(() => onSearch(words.trim()), PAUSE_MS);
    return () => clearTimeout(timer);
  });
  return (
    <label className="relative block min-w-0 flex-1">
      <span className="sr-only">{label}</span>
      <Search aria-hidden size={18} className="absolute top-1/2 left-3 -translate-y-1/2 text-ink-3" />
      <input
        ref={inputRef}
        type="search"
        value={words}
        placeholder={hint}
        maxLength={120}
        onChange={(event) => setWords(event.target.value)}
        onKeyDown={keepUnsent}
        className="min-h-11 w-full rounded-control border border-edge bg-surface pr-3 pl-10 text-ink placeholder:text-ink-3"
      />
    </label>
  );
}

/** Enter is no wish to send a form around the search. */
const keepUnsent = (event: KeyboardEvent) => {
  if (event.key === 'Enter') event.preventDefault();
};
