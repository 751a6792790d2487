import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import { api } from '../../../server/contract/index';
import type { Settings as SettingsOf } from '../../../server/contract/settings';
import { page } from '../../api/page';
import { q } from '../../api/query';
import { FormSection } from '../../form/form-section';
import { PageTitle } from '../../layouts/page-title';
import { useMembership } from '../../lib/me';
import { paths } from '../../paths';
import { linkClass } from '../../ui/link-class';
import { DeskForm } from './desk-form';
import { HolidaysForm } from './holidays-form';
import { Logo } from './logo';
import { MailForm } from './mail-form';
import { ProducerForm } from './producer-form';
import { RiskForm } from './risk-form';

export const settingsPage = page({
  words: ['settings', 'validation'],
  queries: ({ params }) => ({ found: q(api.settings.read, { params: { producer: params.producer ?? '' } }) }),
  View: Settings,
});

/** What holds for the whole producer; each part is saved by itself. */
function Settings({ found }: { found: SettingsOf }) {
  const { t } = useTranslation('settings');
  const { slug } = useMembership().producer;
  // What was saved here last, not what is fetched meanwhile: a form must not pass over what another admin changed.
  const [settings, setSettings] = useState(found);
  const part = { settings, onSaved: setSettings };
  return (
    <div className="grid max-w-2xl gap-6 px-4 py-5 lg:px-7 lg:py-6">
      <PageTitle title={t('title')} />
      <div>
        <h1 className="text-title font-bold">{t('title')}</h1>
        <p className="mt-1 max-w-prose text-ink-2">{t('lead')}</p>
        <Link to={paths.changes(slug)} className={linkClass()}>
          {t('changes')}
        </Link>
      </div>
      <FormSection title={t('producer.title')}>
        <ProducerForm {...part} />
      </FormSection>
      <FormSection title={t('logo.title')}>
        <Logo />
      </FormSection>
      <FormSection title={t('desk.title')}>
        <DeskForm {...part} />
      </FormSection>
      <FormSection title={t('holidays.title')}>
        <HolidaysForm {...part} />
      </FormSection>
      <FormSection title={t('risk.title')}>
        <RiskForm {...part} />
      </FormSection>
      <FormSection title={t('mail.title')}>
        <MailForm {...part} />
      </FormSection>
    </div>
  );
}
