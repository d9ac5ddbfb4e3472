import { fileTypeFromBuffer } from 'file-type';
import sharp from 'sharp';
import { badInput, HttpProblem } from '../platform/errors/http-problem.js';
import { AtMost } from '../platform/threads/at-most.js';

/** A photo made anew by us: its pixels, and nothing else that came with it. */
export interface Photo {
  readonly bytes: Buffer;
  readonly width: number;
  readonly height: number;
}

/** Told by what a file holds; its name and what the sender says of it count for nothing. */
const known = new Set(['image/jpeg', 'image/png', 'image/webp', 'image/heic', 'image/heif']);
/** More pixels than any camera in a workshop gives: what unpacks to more is a bomb. */
const mostPixels = 60_000_000;
const longestSide = 2000;
/** A picture of the most pixels takes some 180 MB while it is unpacked. */
const unpacking = new AtMost(2);

sharp.cache(false);

/**
 * Reads an uploaded picture and makes a JPEG of at most 2000 px a side out of it, the right way up, without where
 * and with what it was taken. Throws a 415 problem for what is no photo and a 400 one for a broken or huge one.
 */
export async function makePhoto(upload: Uint8Array): Promise<Photo> {
  const type = await fileTypeFromBuffer(upload);
  if (!type || !known.has(type.mime)) {
    throw new HttpProblem('unsupported-type', 'A photo is a JPEG, PNG or WebP file.');
  }
  try {
    const { data, info } = await unpacking.run(() =>
      sharp(upload, { limitInputPixels: mostPixels, failOn: 'error' })
        .rotate()
        .resize({ width: longestSide, height: longestSide, fit: 'inside', withoutEnlargement: true })
        .flatten({ background: '#ffffff' })
        .jpeg({ quality: 82, mozjpeg: false })
        .toBuffer({ resolveWithObject: true }),
    );
    return { bytes: data, width: info.width, height: info.height };
  } catch {
    const heic = type.mime === 'image/heic' || type.mime === 'image/heif';
    throw heic
      ? new HttpProblem('unsupported-type', 'This kind of HEIC photo cannot be read here: send it as JPEG.')
      : badInput({ field: 'file', message: 'This picture is broken, or has more than 60 million pixels.' });
  }
}
