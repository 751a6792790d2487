import { useTranslation } from 'react-i18next';
import { Link, useSearchParams } from 'react-router-dom';
import type { FleetDigest, FleetShow } from '../../../server/contract/fleet';
import { useFormat } from '../../lib/format';

const wrongs = ['first', 'warm', 'silent'] as const;

interface Props {
  digest: FleetDigest;
  /** Whether the reader is told of trucks. */
  trucks: boolean;
}

/** How the freezers stand, in a sentence; each thing that is wrong is a link to the freezers meant. */
export function Digest({ digest, trucks }: Props) {
  const { t } = useTranslation('freezers');
  const format = useFormat();
  const wrong = wrongs.filter((show) => digest[show] > 0);
  const seen = digest.all - digest.unfitted;
  if (digest.all === 0) return null;
  if (wrong.length === 0) return <p className={look}>{seen === 0 ? t('digest.unseen', { count: digest.all }) : t(trucks ? 'digest.fine' : 'digest.fine-untold', { count: seen })}</p>;
  const alone = digest.all === 1;
  const said = (show: FleetShow) => {
    const key = show === 'first' && !trucks ? 'soon' : show;
    return alone ? t(`digest.alone.${key}`) : t(`digest.${key}`, { count: digest[show] });
  };
  const sentence = t(alone ? 'digest.alone.of' : 'digest.of', { all: format.number(digest.all), list: format.list(wrong.map((show) => `<${show}>`)) });
  return (
    <p className={look}>
      {sentence.split(/<(\w+)>/).map((part) => {
        const show = wrong.find((one) => one === part);
        return show ? <ShowLink key={part} show={show} words={said(show)} /> : part;
      })}
    </p>
  );
}

const look = 'mt-1 max-w-3xl text-lead text-ink-2';

function ShowLink({ show, words }: { show: FleetShow; words: string }) {
  const [search] = useSearchParams();
  const wanted = new URLSearchParams(search);
  wanted.delete('after');
  wanted.set('show', show);
  return (
    <Link to={{ search: wanted.toString() }} replace className="font-bold text-ink underline decoration-edge underline-offset-4 hover:decoration-fjord">
      {words}
    </Link>
  );
}
