import { useId, useState, type ChangeEvent } from 'react';
import { ImagePlus } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import { api } from '../../../server/contract/index';
import { useAct } from '../../api/act';
import { urlOf } from '../../api/call';
import { ProblemNote } from '../../form/problem-note';
import { useTyped } from '../../form/typed';
import { useMembership } from '../../lib/me';
import { Button, ButtonRow } from '../../ui/button';
import { FieldError } from '../../ui/field';
import { usePicture } from '../../ui/use-picture';
import { logoFault, logoTypes } from './logo-fault';

/** The producer's picture: chosen, looked at, then saved; or taken away. */
export function Logo() {
  const { t } = useTranslation('settings');
  const { slug, logo } = useMembership().producer;
  const [file, setFile] = useState<File | null>(null);
  const [done, setDone] = useState<'saved' | 'removed' | null>(null);
  const typed = useTyped(file !== null);
  const stale = [api.settings.read, api.me.read];
  const set = useAct(api.settings.setLogo, stale);
  const clear = useAct(api.settings.clearLogo, stale);
  const params = { producer: slug };
  const fault = file && logoFault(file);
  const problem = set.error ?? clear.error;

  const choose = (chosen: File | null) => {
    set.reset();
    clear.reset();
    setDone(null);
    setFile(chosen);
  };
  const finish = (how: 'saved' | 'removed') => {
    typed.release();
    setFile(null);
    setDone(how);
  };
  const save = (picture: File) => {
    const files = new FormData();
    files.set('logo', picture);
    set.mutate({ params, files }, { onSuccess: () => finish('saved') });
  };
  return (
    <div className="grid gap-4">
      {file && !fault && <Chosen file={file} />}
      {!file && logo && <img src={`${urlOf(api.settings.readLogo, params)}?${logo}`} alt={t('logo.now')} className={pictureClass} />}
      {!file && !logo && <p className="text-ink-2">{t('logo.none')}</p>}
      <Picker fault={fault ? t(`logo.${fault}`) : undefined} onChoose={choose} />
      {problem && <ProblemNote problem={problem} />}
      <ButtonRow>
        {file && !fault && (
          <Button size="big" busy={set.isPending} onClick={() => save(file)}>
            {t('logo.save')}
          </Button>
        )}
        {file && (
          <Button variant="quiet" size="big" onClick={() => choose(null)}>
            {t('logo.keep')}
          </Button>
        )}
        {!file && logo && (
          <Button variant="quiet" size="big" busy={clear.isPending} onClick={() => clear.mutate({ params }, { onSuccess: () => finish('removed') })}>
            {t('logo.remove')}
          </Button>
        )}
      </ButtonRow>
      <p role="status" className="text-ink-2 empty:hidden">
        {done && t(`logo.${done}`)}
      </p>
    </div>
  );
}

const pictureClass = 'max-h-24 max-w-60 justify-self-start rounded-control border border-rule bg-surface object-contain p-2';

function Chosen({ file }: { file: File }) {
  const { t } = useTranslation('settings');
  return <img ref={usePicture(file)} alt={t('logo.chosen', { name: file.name })} className={pictureClass} />;
}

function Picker({ fault, onChoose }: { fault: string | undefined; onChoose: (file: File) => void }) {
  const { t } = useTranslation('settings');
  const id = useId();
  const change = ({ target }: ChangeEvent<HTMLInputElement>) => {
    const [file] = target.files ?? [];
    if (file) onChoose(file);
    // The same file may be chosen again after a look at another.
    target.value = '';
  };
  return (
    <div>
      <p id={`${id}-hint`} className="text-body text-ink-3">
        {t('logo.hint')}
      </p>
      <label className="mt-1 inline-flex min-h-12 cursor-pointer items-center gap-2 rounded-control border border-dashed border-edge px-4 font-semibold text-fjord hover:bg-fjord-tint has-focus-visible:outline-2 has-focus-visible:outline-offset-2 has-focus-visible:outline-fjord">
        <ImagePlus aria-hidden size={18} />
        {t('logo.choose')}
        <input
          type="file"
          accept={logoTypes.join(',')}
          aria-describedby={fault ? `${id}-error ${id}-hint` : `${id}-hint`}
          aria-invalid={fault ? true : undefined}
          onChange={change}
          className="sr-only"
        />
      </label>
      <div role="alert">{fault && <FieldError id={`${id}-error`}>{fault}</FieldError>}</div>
    </div>
  );
}
