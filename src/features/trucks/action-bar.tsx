import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import type { TruckRow } from '../../../server/contract/trucks';
import { Button, ButtonRow } from '../../ui/button';
import { useNow } from '../stores/use-now';
import { SetWindow } from './set-window';
import { proposeUsual, proposeWindow, trucksOf } from './truck-drafts';
import type { Telling } from './use-telling';

interface Props {
  /** The chosen. */
  rows: TruckRow[];
  telling: Telling;
}

/** What can be done with the chosen stores and with the drafts, at hand wherever the list is; a low screen it would fill. */
export function ActionBar({ rows, telling }: Props) {
  const { t } = useTranslation('trucks');
  if (rows.length === 0 && telling.drafts.size === 0) return null;
  return (
    <div
      role="group"
      aria-label={t('actions')}
      className="bottom-14 z-20 -mx-4 [@media(min-height:34rem)]:sticky flex flex-wrap items-center justify-between gap-x-8 gap-y-2 border-t border-rule bg-surface px-4 py-2.5 lg:bottom-0 lg:-mx-7 lg:px-7"
    >
      {rows.length > 0 && <ForChosen rows={rows} telling={telling} />}
      {telling.drafts.size > 0 && <ForDrafts telling={telling} />}
    </div>
  );
}

function ForChosen({ rows, telling }: Props) {
  const { t } = useTranslation('trucks');
  const [asking, setAsking] = useState(false);
  const unusual = rows.filter(({ usual }) => usual === null).length;
  return (
    <div className="grid w-full gap-x-4 gap-y-1 sm:flex sm:w-auto sm:items-center">
      <p role="status" className="flex flex-wrap items-baseline gap-x-3 sm:block">
        <span className="font-semibold">{t('chosen', { count: rows.length })}</span>
        {unusual > 0 && <span className="text-small text-ink-3 sm:block">{t('without-usual', { count: unusual })}</span>}
      </p>
      <ButtonRow>
        <Button variant="quiet" disabled={unusual === rows.length} onClick={() => telling.change((drafts) => proposeUsual(drafts, rows))}>
          {t('use-usual')}
        </Button>
        <Button variant="quiet" onClick={() => setAsking(true)}>
          {t('set-window')}
        </Button>
      </ButtonRow>
      <SetWindow
        open={asking}
        count={rows.length}
        onClose={() => setAsking(false)}
        onSet={(window) => telling.change((drafts) => proposeWindow(drafts, rows, window))}
      />
    </div>
  );
}

function ForDrafts({ telling: { drafts, change, tell, pending } }: Pick<Props, 'telling'>) {
  const { t } = useTranslation('trucks');
  const trucks = trucksOf(drafts, useNow());
  return (
    <div className="w-full sm:w-auto">
      <ButtonRow>
        <Button busy={pending} disabled={trucks.length === 0} onClick={() => tell(trucks)}>
          {t('tell', { count: trucks.length })}
        </Button>
        <Button variant="quiet" disabled={pending} onClick={() => change(() => new Map())}>
          {t('take-all-back')}
        </Button>
      </ButtonRow>
    </div>
  );
}
