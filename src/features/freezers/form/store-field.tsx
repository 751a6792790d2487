import { useRef, useState } from 'react';
import { keepPreviousData, useQuery } from '@tanstack/react-query';
import { useController } from 'react-hook-form';
import { useTranslation } from 'react-i18next';
import { Problem } from '../../../api/call';
import { ProblemNote } from '../../../form/problem-note';
import { useMembership } from '../../../lib/me';
import { SearchBox } from '../../../table/search-box';
import { Button } from '../../../ui/button';
import { storeQueryOf } from '../../stores/store-query';
import { useFoundStores } from '../../stores/use-found-stores';
import { PickList } from '../pick-list';

/** In which store the freezer stands; another is found by typing. */
export function StoreField() {
  const { t } = useTranslation('freezer-form');
  const { slug } = useMembership().producer;
  const { field } = useController({ name: 'storeId' });
  const storeId = String(field.value);
  const [searching, setSearching] = useState(false);
  const button = useRef<HTMLDivElement>(null);
  const { data } = useQuery({ ...storeQueryOf(slug, storeId), placeholderData: keepPreviousData, refetchInterval: false });
  const choose = (id: string) => {
    field.onChange(id);
    setSearching(false);
    button.current?.focus();
  };
  return (
    <div ref={button} tabIndex={-1} role="group" aria-label={t('store.label')} className="outline-none">
      <p className="font-semibold">{t('store.label')}</p>
      <p>{data ? t('store.at', { name: data.store.name, street: data.store.street, city: data.store.city }) : t('store.unknown')}</p>
      {searching ? (
        <Search onChoose={choose} />
      ) : (
        <div className="mt-2">
          <Button variant="quiet" onClick={() => setSearching(true)}>
            {t('store.other')}
          </Button>
        </div>
      )}
    </div>
  );
}

interface SearchProps {
  onChoose: (storeId: string) => void;
}

function Search({ onChoose }: SearchProps) {
  const { t } = useTranslation('freezer-form');
  const [words, setWords] = useState('');
  return (
    <div className="mt-2">
      <search className="flex">
        <SearchBox label={t('store.search')} hint={t('store.search-hint')} value={words} onSearch={setWords} />
      </search>
      {words && <Found words={words} onChoose={onChoose} />}
    </div>
  );
}

function Found({ words, onChoose }: SearchProps & { words: string }) {
  const { t } = useTranslation('freezer-form');
  const { data, error } = useFoundStores(words);
  if (error instanceof Problem) return <ProblemNote problem={error} />;
  if (!data) return null;
  return (
    <div className="mt-3">
      <p role="status" className={data.stores.length > 0 ? 'sr-only' : 'text-ink-2'}>
        {data.stores.length === 0 ? t('store.nothing') : t('store.count', { count: data.stores.length })}
      </p>
      {data.stores.length > 0 && (
        <PickList
          label={t('store.found')}
          items={data.stores.map(({ id, name, street, city }) => ({ id, title: name, hint: t('store.street', { street, city }) }))}
          onPick={onChoose}
        />
      )}
      {data.next && <p className="mt-2 text-small text-ink-3">{t('store.narrow')}</p>}
    </div>
  );
}
