import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { api } from '../../../server/contract/index';
import { maxPhotoBytes, maxPhotos, type Request } from '../../../server/contract/requests';
import { useAct } from '../../api/act';
import { Problem } from '../../api/call';
import { ProblemNote } from '../../form/problem-note';
import { useTyped } from '../../form/typed';
import { useMembership } from '../../lib/me';
import { Button } from '../../ui/button';
import { FileInput } from '../../ui/file-input';

/** More photos, as long as the request has room for them: looked at first, then sent. */
export function AddPhotos({ request }: { request: Request }) {
  const { t } = useTranslation('requests');
  const { producer } = useMembership();
  const [files, setFiles] = useState<File[]>([]);
  const act = useAct(api.requests.addPhotos, [api.requests.read, api.requests.list, api.stores.read]);
  useTyped(files.length > 0);
  const room = maxPhotos - request.photoList.length;
  const large = files.some(({ size }) => size > maxPhotoBytes);
  const problem = large ? new Problem('photo-too-large', 413) : act.error;
  const send = () => act.mutate({ params: { producer: producer.slug, requestId: request.id }, files: asForm(files) }, { onSuccess: () => setFiles([]) });

  return (
    <div className="mt-6">
      {room > 0 && (
        <FileInput
          label={t('photos.add')}
          hint={t('photos.hint', { count: room })}
          files={files}
          onChange={setFiles}
          max={room}
          accept="image/jpeg,image/png,image/webp"
          words={{
            add: t('photos.choose'),
            camera: t('photos.take'),
            remove: (name) => t('photos.remove', { name }),
            preview: (name) => t('photos.preview', { name }),
            count: t('photos.chosen', { count: files.length }),
          }}
        />
      )}
      {problem && <ProblemNote problem={problem} />}
      {files.length > 0 && !large && (
        <div className="mt-2">
          <Button busy={act.isPending} onClick={send}>
            {t('photos.send', { count: files.length })}
          </Button>
        </div>
      )}
      <p role="status" className="text-ink-2 empty:hidden">
        {act.isSuccess && files.length === 0 && t('photos.sent')}
      </p>
    </div>
  );
}

function asForm(files: File[]): FormData {
  const form = new FormData();
  for (const file of files) form.append('photos', file);
  return form;
}
