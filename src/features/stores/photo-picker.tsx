import { useTranslation } from 'react-i18next';
import { maxPhotos } from '../../../server/contract/requests';
import { FileInput } from '../../ui/file-input';
import { photoTypes, type usePhotos } from './photos';

/** Up to five photos beside a report, and what is said of those left out. */
export function PhotoPicker({ photos, refusals, choose }: ReturnType<typeof usePhotos>) {
  const { t } = useTranslation('report');
  const error = refusals.map((refusal) => (refusal.key === 'full' ? t('photos.full') : t('photos.refused', { name: refusal.name }))).join(' ');
  return (
    <FileInput
      label={t('photos.label')}
      hint={t('photos.hint')}
      error={error || undefined}
      files={photos}
      onChange={choose}
      // While there is room, take all that is chosen: what does not fit is said.
      max={photos.length < maxPhotos ? Infinity : maxPhotos}
      accept={photoTypes.join(',')}
      words={{
        add: t('photos.add'),
        camera: t('photos.take'),
        remove: (name) => t('photos.remove', { name }),
        preview: (name) => t('photos.preview', { name }),
        count: t('photos.count', { count: photos.length, max: maxPhotos }),
      }}
    />
  );
}
