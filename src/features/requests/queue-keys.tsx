import type { RefObject } from 'react';
import { useTranslation } from 'react-i18next';
import { ListKeys } from '../../table/list-keys';

interface Props {
  searchRef: RefObject<HTMLInputElement | null>;
  /** Closes the open request; absent while none is. */
  close?: () => void;
}

/** The queue by keyboard. */
export function QueueKeys({ searchRef, close }: Props) {
  const { t } = useTranslation('requests');
  const help = (['search', 'move', 'open', 'close', 'help'] as const).map((key) => ({ key: t(`keys.names.${key}`), does: t(`keys.${key}`) }));
  return <ListKeys searchRef={searchRef} close={close} title={t('keys.title')} help={help} />;
}
