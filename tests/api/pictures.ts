import { deflateSync } from 'node:zlib';
import sharp, { type Sharp } from 'sharp';

/** Good and bad files, made here. */

const plain = (width = 40, height = 30) => sharp({ create: { width, height, channels: 3, background: '#3377aa' } });

/** A place that must not survive: 37° 12' N, 93° 17' W, and a camera of this name. */
export const camera = 'Peekaboo 9000';
const withPlace = (image: Sharp, orientation = 1) =>
  image.withExif({
    IFD0: { Make: camera, Orientation: String(orientation), Copyright: 'somebody' },
    IFD3: { GPSLatitudeRef: 'N', GPSLatitude: '37/1 12/1 0/1', GPSLongitudeRef: 'W', GPSLongitude: '93/1 17/1 0/1' },
  });

export interface Given {
  name: string;
  type: string;
  bytes: Buffer;
}
const given = (name: string, type: string, bytes: Buffer): Given => ({ name, type, bytes });

export async function goodPictures(): Promise<Given[]> {
  const jpeg = await plain().jpeg().toBuffer();
  const png = await plain().png().toBuffer();
  return [
    given('plain.jpg', 'image/jpeg', jpeg),
    given('plain.png', 'image/png', png),
    given('plain.webp', 'image/webp', await plain().webp().toBuffer()),
    given('place.jpg', 'image/jpeg', await withPlace(plain()).jpeg().toBuffer()),
    given('turned.jpg', 'image/jpeg', await withPlace(plain(), 6).withMetadata({ orientation: 6 }).jpeg().toBuffer()),
    given('place.webp', 'image/webp', await withPlace(plain()).webp().toBuffer()),
    given('place.png', 'image/png', await withPlace(plain()).png().toBuffer()),
    given('grey.jpg', 'image/jpeg', await plain().greyscale().jpeg().toBuffer()),
    given('cmyk.jpg', 'image/jpeg', await plain().toColourspace('cmyk').jpeg().toBuffer()),
    given('clear.png', 'image/png', await sharp({ create: { width: 9, height: 9, channels: 4, background: '#0000' } }).png().toBuffer()),
    given('large.jpg', 'image/jpeg', await plain(4000, 3000).jpeg({ quality: 30 }).toBuffer()),
    given('thin.png', 'image/png', await plain(3000, 1).png().toBuffer()),
    // Right content under a wrong name and type: the content decides.
    given('page.html', 'text/html', jpeg),
    given('../../etc/passwd', 'application/octet-stream', png),
    given('no-name', '', jpeg),
    // A picture that is also something else: only the picture is kept.
    given('script-behind.jpg', 'image/jpeg', Buffer.concat([jpeg, Buffer.from(`<script>/*${camera}*/alert(1)</script>`)])),
    given('zip-behind.png', 'image/png', Buffer.concat([png, Buffer.from('PK\u0003\u0004'), Buffer.from(camera)])),
    given('comment.jpg', 'image/jpeg', withComment(jpeg, `<?php ${camera} ?>`)),
  ];
}

export async function badPictures(): Promise<Given[]> {
  const jpeg = await plain(200, 200).jpeg().toBuffer();
  const png = await plain(200, 200).png().toBuffer();
  return [
    given('empty.jpg', 'image/jpeg', Buffer.alloc(0)),
    given('text.jpg', 'image/jpeg', Buffer.from('this is no picture at all, only words')),
    given('page.jpg', 'image/jpeg', Buffer.from('<!doctype html><script>alert(1)</script>')),
    given('drawing.svg', 'image/svg+xml', Buffer.from('<svg xmlns="http://www.w3.org/2000/svg"><script>alert(1)</script></svg>')),
    given('drawing.png', 'image/png', Buffer.from('<?xml version="1.0"?><svg xmlns="http://www.w3.org/2000/svg"/>')),
    given('moving.gif', 'image/gif', await plain().gif().toBuffer()),
    given('moving.jpg', 'image/jpeg', await plain().gif().toBuffer()),
    given('scan.tiff', 'image/jpeg', await plain().tiff().toBuffer()),
    given('archive.zip', 'image/jpeg', Buffer.from('504b0506000000000000000000000000000000000000', 'hex')),
    given('paper.pdf', 'image/jpeg', Buffer.from('%PDF-1.7\n1 0 obj<<>>endobj\n%%EOF')),
    given('program.exe', 'image/png', Buffer.concat([Buffer.from('MZ'), Buffer.alloc(200)])),
    given('cut.jpg', 'image/jpeg', jpeg.subarray(0, Math.floor(jpeg.length / 2))),
    given('cut.png', 'image/png', png.subarray(0, Math.floor(png.length / 2))),
    given('head-only.jpg', 'image/jpeg', Buffer.concat([jpeg.subarray(0, 20), Buffer.alloc(500, 0x41)])),
    given('head-only.webp', 'image/webp', Buffer.from('RIFF\u0020\u0000\u0000\u0000WEBPVP8 ', 'latin1')),
    given('bomb.png', 'image/png', hugePng(30_000, 30_000)),
  ];
}

/** A JPEG comment segment right behind the start marker. */
function withComment(jpeg: Buffer, words: string): Buffer {
  const text = Buffer.from(words);
  const length = Buffer.alloc(2);
  length.writeUInt16BE(text.length + 2);
  return Buffer.concat([jpeg.subarray(0, 2), Buffer.from([0xff, 0xfe]), length, text, jpeg.subarray(2)]);
}

/** A few kilobytes that unfold to hundreds of millions of pixels. */
function hugePng(width: number, height: number): Buffer {
  const header = Buffer.alloc(13);
  header.writeUInt32BE(width, 0);
  header.writeUInt32BE(height, 4);
  header.set([1, 0, 0, 0, 0], 8);
  const rows = deflateSync(Buffer.alloc((Math.ceil(width / 8) + 1) * 400));
  return Buffer.concat([Buffer.from('89504e470d0a1a0a', 'hex'), chunk('IHDR', header), chunk('IDAT', rows), chunk('IEND', Buffer.alloc(0))]);
}

function chunk(type: string, data: Buffer): Buffer {
  const body = Buffer.concat([Buffer.from(type), data]);
  const size = Buffer.alloc(4);
  size.writeUInt32BE(data.length);
  const sum = Buffer.alloc(4);
  sum.writeUInt32BE(crc32(body));
  return Buffer.concat([size, body, sum]);
}

/** PNG's checksum, bit by bit (PNG specification, annex D). */
function crc32(bytes: Buffer): number {
  let crc = 0xffffffff;
  for (const byte of bytes) {
    crc ^= byte;
    for (let bit = 0; bit < 8; bit += 1) crc = crc & 1 ? (crc >>> 1) ^ 0xedb88320 : crc >>> 1;
  }
  return (crc ^ 0xffffffff) >>> 0;
}
