import { useId, useState } from 'react';
import { ImagePlus } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import { api } from '../../../server/contract/index';
import { maxPhotoBytes, maxPhotos, type Request } from '../../../server/contract/requests';
import { useAct } from '../../api/act';
import { Problem } from '../../api/call';
import { ProblemNote } from '../../form/problem-note';
import { useMembership } from '../../lib/me';

/** More photos, as long as the request has room for them. */
export function AddPhotos({ request }: { request: Request }) {
  const { t } = useTranslation('requests');
  const { producer } = useMembership();
  const send = useAct(api.requests.addPhotos, [api.requests.read, api.requests.list, api.stores.read]);
  const [refusal, refuse] = useState<Problem | null>(null);
  const id = useId();
  const room = maxPhotos - request.photoList.length;
  if (room <= 0) return null;

  const take = (files: File[]) => {
    const wrong = fault(files, room);
    refuse(wrong);
    send.reset();
    if (wrong || files.length === 0) return;
    const form = new FormData();
    for (const file of files) form.append('photos', file);
    send.mutate({ params: { producer: producer.slug, requestId: request.id }, files: form });
  };
  const problem = refusal ?? send.error;

  return (
    <div className="mt-3">
      <label
        htmlFor={id}
        className="inline-flex min-h-12 cursor-pointer items-center gap-2 rounded-control border border-edge px-4 font-semibold text-fjord focus-within:outline-2 focus-within:outline-offset-2 focus-within:outline-fjord"
      >
        <ImagePlus aria-hidden size={18} />
        {send.isPending ? t('photos.sending') : t('photos.add')}
        <input
          id={id}
          type="file"
          multiple
          accept="image/jpeg,image/png,image/webp"
          disabled={send.isPending}
          aria-describedby={`${id}-hint`}
          className="sr-only"
          onChange={(event) => {
            take([...(event.target.files ?? [])]);
            event.target.value = '';
          }}
        />
      </label>
      <p id={`${id}-hint`} className="mt-1 text-small text-ink-3">
        {t('photos.hint', { count: room })}
      </p>
      <p role="status" className="text-small text-ink-2">
        {send.isSuccess && t('photos.sent')}
      </p>
      {problem && <ProblemNote problem={problem} />}
    </div>
  );
}

/** Found before anything is sent; the server looks again. */
function fault(files: File[], room: number): Problem | null {
  if (files.length > room) return new Problem('too-many-photos', 422);
  return files.some(({ size }) => size > maxPhotoBytes) ? new Problem('photo-too-large', 413) : null;
}
