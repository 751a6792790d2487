import { useRef, useState } from 'react';
import { X } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import { Problem } from '../../api/call';
import { ProblemNote } from '../../form/problem-note';
import { SearchBox } from '../../table/search-box';
import { IconButton } from '../../ui/button';
import { useFoundStores } from '../stores/use-found-stores';
import { CheckGroup } from './check-group';

interface Props {
  chosen: string[];
  names: ReadonlyMap<string, string>;
  onNamed: (storeId: string, name: string) => void;
  onToggle: (storeId: string) => void;
}

/** Single stores, found by typing. */
export function StorePicker({ chosen, names, onNamed, onToggle }: Props) {
  const { t } = useTranslation('people');
  const [words, setWords] = useState('');
  const box = useRef<HTMLInputElement>(null);
  const remove = (storeId: string) => {
    onToggle(storeId);
    // The pressed button is gone with its store.
    box.current?.focus();
  };
  return (
    <fieldset>
      <legend className="text-body font-semibold text-ink-2">{t('stores.title')}</legend>
      {chosen.length > 0 && (
        <ul aria-label={t('stores.chosen')} className="mt-1 mb-3 border-t border-rule">
          {chosen.map((id) => (
            <li key={id} className="flex items-center justify-between gap-3 border-b border-rule">
              <span className="min-w-0 wrap-anywhere">{names.get(id)}</span>
              <IconButton label={t('stores.remove', { name: names.get(id) })} icon={<X aria-hidden size={20} />} onClick={() => remove(id)} />
            </li>
          ))}
        </ul>
      )}
      <search className="mt-1 flex">
        <SearchBox label={t('stores.search')} hint={t('stores.search-hint')} value={words} onSearch={setWords} inputRef={box} />
      </search>
      {words && <Found words={words} chosen={chosen} onNamed={onNamed} onToggle={onToggle} />}
    </fieldset>
  );
}

function Found({ words, chosen, onNamed, onToggle }: Omit<Props, 'names'> & { words: string }) {
  const { t } = useTranslation('people');
  const { data, error } = useFoundStores(words);
  if (error instanceof Problem) return <ProblemNote problem={error} />;
  if (!data) return null;
  const toggle = (id: string) => {
    const store = data.stores.find((found) => found.id === id);
    if (store) onNamed(id, store.name);
    onToggle(id);
  };
  return (
    <div className="mt-3">
      <p role="status" className="sr-only">
        {t('stores.count', { count: data.stores.length })}
      </p>
      <CheckGroup
        legend={t('stores.found')}
        none={t('stores.none')}
        items={data.stores.map(({ id, name, street, city }) => ({ id, name, detail: t('stores.at', { street, city }) }))}
        chosen={chosen}
        onToggle={toggle}
      />
      {data.next && <p className="text-small text-ink-3">{t('stores.narrow')}</p>}
    </div>
  );
}
