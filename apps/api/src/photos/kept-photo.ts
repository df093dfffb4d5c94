import sharp from 'sharp';
import { AppError } from '../errors/app-error';

export interface KeptPhoto {
  bytes: Buffer;
  widthPx: number;
  heightPx: number;
}

/** Long enough to read the numbers on a tape measure; common practice, no source. */
const longestSidePx = 2048;
/** More than cameras make; a small file that claims more would only fill the memory. */
const mostPixels = 100_000_000;
const formats = ['jpeg', 'png', 'webp'];

/**
 * Draws a photo anew as a JPEG: upright and not larger than needed. Nothing but the picture goes along, so where and when
 * it was taken stays behind.
 *
 * @throws {AppError} `photo-refused`, with one sentence
 */
export async function keptPhoto(received: Buffer): Promise<KeptPhoto> {
  try {
    const picture = sharp(received, { limitInputPixels: mostPixels, failOn: 'error' });
    const { format } = await picture.metadata();
    if (!formats.includes(format ?? '')) throw refused();
    const { data, info } = await picture
      .rotate()
      .resize(longestSidePx, longestSidePx, { fit: 'inside', withoutEnlargement: true })
      .flatten({ background: '#ffffff' })
      .jpeg({ quality: 82, mozjpeg: true })
      .toBuffer({ resolveWithObject: true });
    return { bytes: data, widthPx: info.width, heightPx: info.height };
  } catch (error) {
    throw error instanceof AppError ? error : refused(error);
  }
}

const refused = (cause?: unknown) =>
  new AppError('photo-refused', 'This is no photo that can be read. Add a JPEG, a PNG or a WebP.', { cause });
