import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { api } from '../../../server/contract/index';
import type { Request } from '../../../server/contract/requests';
import { urlOf } from '../../api/call';
import { useMembership } from '../../lib/me';
import { Dialog } from '../../ui/dialog';

/** Small ones in a row; each opens larger over the page. */
export function Photos({ request }: { request: Request }) {
  const { t } = useTranslation(['requests', 'common']);
  const { producer } = useMembership();
  const [shown, show] = useState<number | null>(null);
  const { photoList, id: requestId } = request;
  const src = (photoId: string) => urlOf(api.requests.readPhoto, { producer: producer.slug, requestId, photoId });
  const name = (i: number) => t('photos.alt', { n: i + 1, count: photoList.length, number: t('number', { number: request.number }) });
  const large = shown === null ? undefined : photoList[shown];
  if (photoList.length === 0) return null;
  return (
    <section className="mt-5" aria-label={t('photos.title')}>
      <ul className="flex flex-wrap gap-2">
        {photoList.map(({ id }, i) => (
          <li key={id}>
            <button
              type="button"
              aria-label={t('photos.open', { n: i + 1, count: photoList.length })}
              onClick={() => show(i)}
              className="block overflow-hidden rounded-control border border-rule"
            >
              <img src={src(id)} alt="" width={96} height={96} loading="lazy" className="size-24 object-cover" />
            </button>
          </li>
        ))}
      </ul>
      <Dialog open={large !== undefined} title={shown === null ? '' : name(shown)} onClose={() => show(null)} closeLabel={t('common:close')} wide>
        {large && shown !== null && (
          <img src={src(large.id)} alt={name(shown)} width={large.width} height={large.height} className="max-h-[75dvh] w-full object-contain" />
        )}
      </Dialog>
    </section>
  );
}
