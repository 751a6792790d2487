import { lazy, Suspense } from 'react';
import { Skeleton } from '../ui/skeleton';
import type { Place } from './view';

export interface PlacePickerProps {
  latitude: number | null;
  longitude: number | null;
  /** Shown faintly; where the map begins while there is no place yet. */
  around?: Place[];
  label: string;
  /** In degrees, to four decimals: ten yards. */
  onPick: (latitude: number, longitude: number) => void;
}

const Drawn = lazy(async () => ({ default: (await import('./picked-place')).PickedPlace }));

/** Marks one place on a map, by a press or by keys; what draws maps is fetched with the first one. */
export const PlacePicker = (props: PlacePickerProps) => (
  <Suspense fallback={<Skeleton className="h-80" />}>
    <Drawn {...props} />
  </Suspense>
);
