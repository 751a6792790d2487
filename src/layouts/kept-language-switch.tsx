import { api } from '../../server/contract/index';
import { useAct } from '../api/act';
import { LanguageSwitch } from './language-switch';
import { useIsSeeing } from './use-seeing';

/** The switch of somebody signed in: the choice goes with the person, to mails and other devices too. */
export function KeptLanguageSwitch() {
  const isSeeing = useIsSeeing();
  const update = useAct(api.me.update, [api.me.read]);
  if (isSeeing) return null;
  return <LanguageSwitch onChosen={(language) => update.mutate({ body: { language } })} />;
}
