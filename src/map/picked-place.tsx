import { useId, useState, type KeyboardEvent } from 'react';
import { useTranslation } from 'react-i18next';
import { MapCanvas } from './map-canvas';
import type { PlacePickerProps } from './place-picker';
import { useMapSize } from './use-map-size';
import { useMapView, type MapView } from './use-map-view';
import { placeAt, planeOf, screenOf, type Place, type Point, type Size } from './view';

export function PickedPlace(props: PlacePickerProps) {
  const { t } = useTranslation('map');
  const [box, size] = useMapSize();
  const place = placeIn(props);
  return (
    <div>
      <div ref={box} className="min-h-80">
        {size && <Picker {...props} place={place} size={size} />}
      </div>
      <p role="status" className="mt-2 text-small text-ink-2">
        {place ? t('pick.at', { latitude: place.latitude.toFixed(4), longitude: place.longitude.toFixed(4) }) : t('pick.nowhere')}
      </p>
    </div>
  );
}

/** What is being typed may be no place yet. */
function placeIn({ latitude, longitude }: PlacePickerProps): Place | null {
  if (latitude === null || longitude === null) return null;
  return Math.abs(latitude) <= 85 && Math.abs(longitude) <= 180 ? { latitude, longitude } : null;
}

interface PickerProps extends PlacePickerProps {
  place: Place | null;
  size: Size;
}

const steps = { fine: 2, large: 24 };
const nowhere: Place[] = [];

function Picker({ place, around = nowhere, label, onPick, size }: PickerProps) {
  const { t } = useTranslation('map');
  const instructions = useId();
  // What the map begins with; a mark that moves does not move the map.
  const [begin] = useState(() => (place ? [place] : around));
  const map = useMapView(begin, size);
  useFollowing(map, place);
  const pick = ({ latitude, longitude }: Place) => onPick(rounded(latitude), rounded(longitude));
  const step = ({ x, y }: Point, { shiftKey }: KeyboardEvent) => {
    const from = markOf(map, place ?? map.view);
    const by = shiftKey ? steps.large : steps.fine;
    pick(place ? placeAt(map.view, size, { x: from.x + x * by, y: from.y + y * by }) : map.view);
  };
  // Nearer and farther about the mark: it is what is being looked for.
  const zoom = (factor: number) => {
    if (place) map.centre(place);
    map.zoom(factor);
  };
  const hint = (
    <p id={instructions} className="min-w-0 flex-1 basis-52 text-small text-ink-2">
      {t('pick.instructions')}
    </p>
  );
  return (
    <MapCanvas map={{ ...map, zoom }} label={label} role="application" describedBy={instructions} onArrow={step} onPress={pick} beside={hint}>
      <Marks map={map} place={place} around={around} />
    </MapCanvas>
  );
}

/** The map goes along when the mark moves out of it, by a key or because it was typed elsewhere. */
function useFollowing(map: MapView, place: Place | null) {
  const [followed, setFollowed] = useState(place);
  if (place?.latitude === followed?.latitude && place?.longitude === followed?.longitude) return;
  setFollowed(place);
  if (place && !isSeen(markOf(map, place), map.size)) map.centre(place);
}

function Marks({ map, place, around }: { map: MapView; place: Place | null; around: Place[] }) {
  const { width, height } = map.size;
  const neighbours = dotsOf(map, around);
  const mark = place && markOf(map, place);
  return (
    <svg aria-hidden width={width} height={height} className="pointer-events-none absolute inset-0">
      <path d={neighbours} className="stroke-fjord-2" strokeWidth="6" strokeLinecap="round" opacity=".55" />
      {mark && (
        <g transform={`translate(${mark.x} ${mark.y})`} fill="none" strokeLinecap="round">
          <path d={cross} className="stroke-surface" strokeWidth="6" />
          <path d={cross} className="stroke-ink" strokeWidth="2.5" />
        </g>
      )}
    </svg>
  );
}

/** Open in the middle, so that the place itself is seen. */
const cross = 'M-14 0H-4M4 0H14M0-14V-4M0 4V14';

/** All in one path: a neighbour is a line without length under a round end. */
const dotsOf = (map: MapView, around: Place[]): string =>
  around
    .map((place) => markOf(map, place))
    .filter((point) => isSeen(point, map.size))
    .map(({ x, y }) => `M${x.toFixed(1)} ${y.toFixed(1)}h0`)
    .join('');

const markOf = ({ view, size }: MapView, place: Place): Point => screenOf(view, size)(planeOf(place));
const isSeen = ({ x, y }: Point, { width, height }: Size): boolean => x >= 0 && x <= width && y >= 0 && y <= height;
const rounded = (degrees: number): number => Math.round(degrees * 10_000) / 10_000;
