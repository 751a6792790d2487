import { useRef, useState, type KeyboardEvent } from 'react';
import { keepPreviousData, useQuery } from '@tanstack/react-query';
import { X } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import { api } from '../../../server/contract/index';
import { Problem } from '../../api/call';
import { q } from '../../api/query';
import { ProblemNote } from '../../form/problem-note';
import { useMembership } from '../../lib/me';
import { SearchBox } from '../../table/search-box';
import { IconButton } from '../../ui/button';
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
      <search className="mt-1 flex" onKeyDown={keepUnsent}>
        <SearchBox label={t('stores.search')} hint={t('stores.search-hint')} value={words} onSearch={setWords} inputRef={box} />
      </search>
      {words && <Found words={words} chosen={chosen} onNamed={onNamed} onToggle={onToggle} />}
    </fieldset>
  );
}

/** Enter in the search is no wish to send the form around it. */
const keepUnsent = (event: KeyboardEvent) => {
  if (event.key === 'Enter') event.preventDefault();
};

function Found({ words, chosen, onNamed, onToggle }: Omit<Props, 'names'> & { words: string }) {
  const { t } = useTranslation('people');
  const { slug } = useMembership().producer;
  const { data, error } = useQuery({
    ...q(api.stores.list, { params: { producer: slug }, query: { q: words, limit: '10' } }),
    placeholderData: keepPreviousData,
  });
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
