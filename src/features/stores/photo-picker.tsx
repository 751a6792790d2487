import { useId, type ChangeEvent } from 'react';
import { Camera, ImagePlus, X } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import { maxPhotos } from '../../../server/contract/requests';
import { photoTypes, type usePhotos } from './photos';

type Props = ReturnType<typeof usePhotos>;

/** Up to five photos, chosen or taken, each shown and removable. */
export function PhotoPicker({ photos, refusals, add, remove }: Props) {
  const { t } = useTranslation('report');
  const hint = useId();
  return (
    <fieldset aria-describedby={hint}>
      <legend className="text-body font-semibold">{t('photos.label')}</legend>
      <p id={hint} className="mt-0.5 text-small text-ink-3">
        {t('photos.hint')}
      </p>
      <ul className="mt-2 flex flex-wrap gap-2">
        {photos.map((photo, i) => (
          <li key={photo.url} className="relative">
            <img src={photo.url} alt={t('photos.preview', { n: i + 1 })} className="size-24 rounded-control border border-edge object-cover" />
            <button
              type="button"
              aria-label={t('photos.remove', { n: i + 1 })}
              onClick={() => remove(photo)}
              className="absolute top-0 right-0 grid size-12 place-items-start justify-items-end p-1"
            >
              <span className="grid size-7 place-items-center rounded-full border border-edge bg-surface text-ink">
                <X aria-hidden size={16} />
              </span>
            </button>
          </li>
        ))}
        {photos.length < maxPhotos && <Choosers add={add} />}
      </ul>
      <div role="status" className="text-small text-straw">
        {refusals.map((refusal) => (
          <p key={refusal.key === 'full' ? 'full' : refusal.name} className="mt-2">
            {refusal.key === 'full' ? t('photos.full') : t('photos.refused', { name: refusal.name })}
          </p>
        ))}
      </div>
    </fieldset>
  );
}

/** A phone offers its camera as well. */
function Choosers({ add }: Pick<Props, 'add'>) {
  const { t } = useTranslation('report');
  return (
    <>
      <li className="hidden pointer-coarse:block">
        <Chooser label={t('photos.take')} add={add} camera />
      </li>
      <li>
        <Chooser label={t('photos.add')} add={add} />
      </li>
    </>
  );
}

function Chooser({ label, add, camera = false }: Pick<Props, 'add'> & { label: string; camera?: boolean }) {
  const Icon = camera ? Camera : ImagePlus;
  const choose = ({ target }: ChangeEvent<HTMLInputElement>) => {
    add([...(target.files ?? [])]);
    // The same file may be chosen again after it was removed.
    target.value = '';
  };
  return (
    <label className="grid size-24 cursor-pointer place-content-center justify-items-center gap-1 rounded-control border border-dashed border-edge px-1 text-center text-small font-semibold text-fjord has-focus-visible:outline-2 has-focus-visible:outline-offset-2 has-focus-visible:outline-fjord">
      <Icon aria-hidden size={22} />
      {label}
      <input type="file" accept={photoTypes.join(',')} multiple={!camera} capture={camera ? 'environment' : undefined} onChange={choose} className="sr-only" />
    </label>
  );
}
