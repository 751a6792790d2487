import { fileTypeFromBuffer } from 'file-type';
import sharp, { type Sharp } from 'sharp';
import { problem } from '../http/problem';

const MOST_PIXELS = 60_000_000;
const TYPES = new Set(['image/jpeg', 'image/png', 'image/webp']);

export interface Picture {
  bytes: Buffer;
  width: number;
  height: number;
}

/** Draws an uploaded picture anew, so that nothing but the picture is kept; `finish` says in which form. */
export async function redraw(buffer: Buffer, longestSide: number, finish: (picture: Sharp) => Sharp): Promise<Picture> {
  const type = await fileTypeFromBuffer(buffer);
  if (!type || !TYPES.has(type.mime)) throw problem('photo-unreadable');
  try {
    const picture = sharp(buffer, { limitInputPixels: MOST_PIXELS, failOn: 'error' })
      .rotate()
      .resize(longestSide, longestSide, { fit: 'inside', withoutEnlargement: true });
    const { data, info } = await finish(picture).toBuffer({ resolveWithObject: true });
    return { bytes: data, width: info.width, height: info.height };
  } catch {
    throw problem('photo-unreadable');
  }
}
