import { useId } from 'react';
import { Undo2 } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import { dayOf } from '../../../server/domain/civil';
import { IconButton } from '../../ui/button';
import { FieldError } from '../../ui/field';
import { TextInput } from '../../ui/text-input';
import { edit, faultOf, takeBack, type Draft, type DraftFault, type Drafts, type Window } from './truck-drafts';

interface Props {
  draft: Draft;
  now: number;
  onChange: (next: (drafts: Drafts) => Drafts) => void;
}

/** A proposal of one store, to be changed or taken back before it is told. */
export function DraftFields({ draft, now, onChange }: Props) {
  const { t } = useTranslation('trucks');
  const id = useId();
  const { store } = draft.row;
  const fault = faultOf(draft, now);
  const reason = useReason(draft, fault);
  const input = (part: keyof Window) => ({
    value: draft[part],
    'aria-label': t(`draft.${part}`, { store: store.name }),
    'aria-invalid': isWrong(draft, fault, part) || undefined,
    'aria-describedby': reason ? id : undefined,
    onChange: ({ target }: { target: { value: string } }) => onChange((drafts) => edit(drafts, store.id, { [part]: target.value })),
  });
  return (
    <div role="group" aria-label={t('draft.of', { store: store.name })} className="max-w-md border-l-4 border-fjord pl-3">
      <div className="grid grid-cols-[minmax(0,1fr)_auto] items-center gap-2">
        <TextInput {...input('day')} type="date" min={dayOf(now, store.timeZone)} />
        <IconButton
          label={t('draft.take-back', { store: store.name })}
          icon={<Undo2 aria-hidden size={20} />}
          onClick={() => onChange((drafts) => takeBack(drafts, store.id))}
        />
      </div>
      <div className="mt-2 grid grid-cols-[repeat(auto-fit,minmax(7.75rem,1fr))] items-center gap-2 sm:pr-13">
        <TextInput {...input('from')} type="time" />
        <TextInput {...input('to')} type="time" />
      </div>
      {reason && <FieldError id={id}>{reason}</FieldError>}
    </div>
  );
}

/** Why it cannot be told, or why it was refused. */
function useReason(draft: Draft, fault: DraftFault | null): string | null {
  const { t } = useTranslation(['trucks', 'problems']);
  if (fault === 'unfilled') return t('draft.unfilled');
  const problem = fault ?? draft.refused;
  return problem && t(`problems:${problem}.title`);
}

const wrongParts = { 'day-past': 'day', 'window-backwards': 'to' } as const;

const isWrong = (draft: Draft, fault: DraftFault | null, part: keyof Window): boolean =>
  fault === 'unfilled' ? draft[part] === '' : fault !== null && wrongParts[fault] === part;
