import { useState } from 'react';
import { maxPhotoBytes, maxPhotos } from '../../../server/contract/requests';

export const photoTypes = ['image/jpeg', 'image/png', 'image/webp'];

export type Refusal = { key: 'refused'; name: string } | { key: 'full' };

/** Which of the chosen files go along, and what is said of the others. */
export function sortOut(chosen: File[]): { taken: File[]; refusals: Refusal[] } {
  const good = chosen.filter((file) => photoTypes.includes(file.type) && file.size <= maxPhotoBytes);
  const refusals = chosen.filter((file) => !good.includes(file)).map(({ name }): Refusal => ({ key: 'refused', name }));
  const taken = good.slice(0, maxPhotos);
  return { taken, refusals: taken.length < good.length ? [...refusals, { key: 'full' }] : refusals };
}

/** The photos chosen for a report. */
export function usePhotos() {
  const [photos, setPhotos] = useState<File[]>([]);
  const [refusals, setRefusals] = useState<Refusal[]>([]);
  const choose = (chosen: File[]) => {
    const sorted = sortOut(chosen);
    setPhotos(sorted.taken);
    setRefusals(sorted.refusals);
  };
  return { photos, refusals, choose };
}
