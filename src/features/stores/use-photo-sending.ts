import { api } from '../../../server/contract/index';
import { useAct } from '../../api/act';
import type { Problem } from '../../api/call';
import { useTyped } from '../../form/typed';

export interface PhotoSending {
  count: number;
  state: 'idle' | 'pending' | 'success' | 'error';
  problem: Problem | null;
  send: (requestId: string) => void;
}

/** Sends the photos after the request they belong to; the request stays filed whatever becomes of them. */
export function usePhotoSending(producer: string, photos: File[]): PhotoSending {
  const act = useAct(api.requests.addPhotos, [api.requests.read, api.stores.read]);
  useTyped(act.isPending || act.isError);
  const send = (requestId: string) => {
    const files = new FormData();
    for (const photo of photos) files.append('photos', photo);
    act.mutate({ params: { producer, requestId }, files });
  };
  return { count: photos.length, state: act.status, problem: act.error, send };
}
