import type { Request, RequestHandler } from 'express';
import multer from 'multer';
import { maxPhotoBytes, maxPhotos } from '../../contract/requests';
import { eq, photos } from '../../db';
import { hasEnded } from '../../domain/request-steps';
import type { ProducerContext } from '../../http/context';
import { orNotFound, problem } from '../../http/problem';
import { redraw, type Picture } from '../pictures';
import { addEntry, load, ruled } from './actions';

/** Takes the files of a form into memory, within the limits. */
export const takePhotos: RequestHandler = multer({
  storage: multer.memoryStorage(),
  limits: { fileSize: maxPhotoBytes, files: maxPhotos, fields: 4, fieldSize: 1000, parts: maxPhotos + 4 },
}).array('photos', maxPhotos);

const LONGEST_SIDE = 2000;

/** Adds photos to a request: drawn anew, so that nothing but the picture is kept. */
export async function addPhotos(ctx: ProducerContext, id: string, req: Request): Promise<void> {
  const files = Array.isArray(req.files) ? req.files : [];
  const before = load(ctx, id, ctx);
  if (files.length === 0) throw problem('photo-unreadable');
  refuse(before, files.length);
  const pictures = await Promise.all(files.map(({ buffer }) => drawn(buffer)));
  const kept = pictures.map((picture) => ({ ...picture, id: ctx.newId(), file: `${ctx.newId()}.jpg` }));
  await Promise.all(kept.map(({ file, bytes }) => ctx.storage.put(file, bytes)));
  ctx.act('add-photos', (tx) => {
    const request = load(tx, id, ctx);
    tx.authorise('create', 'Request', ruled(request));
    refuse(request, kept.length);
    for (const { id: photoId, file, width, height } of kept) {
      tx.db.insert(photos, { id: photoId, requestId: id, file, width, height, addedBy: ctx.viewer.membershipId, createdAt: ctx.now });
    }
    addEntry(ctx, tx, id, { kind: 'photos', words: String(kept.length) });
    tx.audit('Request', id, { photos: kept.map((photo) => photo.id) });
  });
}

export async function readPhoto({ db, storage }: ProducerContext, requestId: string, photoId: string): Promise<Buffer> {
  const photo = db.select({ file: photos.file, requestId: photos.requestId }).from(photos).where(eq(photos.id, photoId)).get();
  return orNotFound(photo?.requestId === requestId ? await storage.get(photo.file) : null);
}

function refuse(request: ReturnType<typeof load>, more: number): void {
  if (hasEnded(request.state)) throw problem('request-ended');
  if (request.photos + more > maxPhotos) throw problem('too-many-photos', { most: maxPhotos });
}

const drawn = (buffer: Buffer): Promise<Picture> =>
  redraw(buffer, LONGEST_SIDE, (picture) => picture.flatten({ background: '#ffffff' }).jpeg({ quality: 82, mozjpeg: true }));
