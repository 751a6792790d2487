import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { Button, ButtonRow } from '../../ui/button';
import { Field } from '../../ui/field';
import { Notice } from '../../ui/notice';
import { TextInput } from '../../ui/text-input';

interface Props {
  secret: string;
  onDone: () => void;
}

const HEADER = 'authorization: Bearer …';

/** The key itself, which nobody can show again. */
export function KeyShown({ secret, onDone }: Props) {
  const { t } = useTranslation('sensors');
  const [copied, setCopied] = useState<'yes' | 'no' | null>(null);
  // Without a safe connection the browser has no clipboard to write to.
  const copy = () => {
    const written = navigator.clipboard ? navigator.clipboard.writeText(secret) : Promise.reject(new Error('no clipboard'));
    written.then(
      () => setCopied('yes'),
      () => setCopied('no'),
    );
  };
  return (
    <div className="grid gap-4">
      <Notice tone="caution" title={t('keys.shown.once')} role="status">
        {t('keys.shown.keep')}
      </Notice>
      <Field label={t('keys.shown.key')}>
        {(control) => <TextInput {...control} readOnly value={secret} spellCheck={false} autoComplete="off" onFocus={(event) => event.target.select()} />}
      </Field>
      <p>
        {t('keys.shown.where')} <code className="rounded-tag bg-sunk px-1.5 py-0.5 wrap-anywhere">{HEADER}</code>
      </p>
      <ButtonRow>
        <Button onClick={copy}>{t('keys.shown.copy')}</Button>
        <Button variant="quiet" onClick={onDone}>
          {t('keys.shown.done')}
        </Button>
      </ButtonRow>
      <p role="status" className="text-ink-2 empty:hidden">
        {copied && t(`keys.shown.copied.${copied}`)}
      </p>
    </div>
  );
}
