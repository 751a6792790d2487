import { api } from '../../server/contract/index';
import { useAct } from '../api/act';
import { LanguageSwitch } from './language-switch';

/** The switch of somebody signed in: the choice goes with the person, to mails and other devices too. */
export function KeptLanguageSwitch() {
  const update = useAct(api.me.update, [api.me.read]);
  return <LanguageSwitch onChosen={(language) => update.mutate({ body: { language } })} />;
}
