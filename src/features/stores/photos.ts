import { useEffect, useRef, useState } from 'react';
import { maxPhotoBytes, maxPhotos } from '../../../server/contract/requests';

export const photoTypes = ['image/jpeg', 'image/png', 'image/webp'];

export interface Photo {
  /** An object URL of the file, which also tells it apart. */
  url: string;
  file: File;
}

export type Refusal = { key: 'refused'; name: string } | { key: 'full' };

/** Which of the chosen files go along, and what is said of the others. */
export function sortOut(chosen: File[], already: number): { taken: File[]; refusals: Refusal[] } {
  const good = chosen.filter((file) => photoTypes.includes(file.type) && file.size <= maxPhotoBytes);
  const refusals = chosen.filter((file) => !good.includes(file)).map(({ name }): Refusal => ({ key: 'refused', name }));
  const taken = good.slice(0, Math.max(0, maxPhotos - already));
  return { taken, refusals: taken.length < good.length ? [...refusals, { key: 'full' }] : refusals };
}

/** The photos chosen for a report, with their previews. */
export function usePhotos() {
  const [photos, setPhotos] = useState<Photo[]>([]);
  const [refusals, setRefusals] = useState<Refusal[]>([]);
  const shown = useRef<Photo[]>([]);
  useEffect(() => {
    shown.current = photos;
  }, [photos]);
  useEffect(() => () => shown.current.forEach(({ url }) => URL.revokeObjectURL(url)), []);

  const add = (chosen: File[]) => {
    const sorted = sortOut(chosen, photos.length);
    setPhotos([...photos, ...sorted.taken.map((file) => ({ file, url: URL.createObjectURL(file) }))]);
    setRefusals(sorted.refusals);
  };
  const remove = (photo: Photo) => {
    URL.revokeObjectURL(photo.url);
    setPhotos(photos.filter(({ url }) => url !== photo.url));
    setRefusals([]);
  };
  return { photos, refusals, add, remove };
}
