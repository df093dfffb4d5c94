import sharp from 'sharp';

/** As a camera leaves it: on its side, with its place. */
export const cameraPhoto = (): Promise<Buffer> =>
  sharp({ create: { width: 3000, height: 1500, channels: 3, background: '#a05030' } })
    .jpeg()
    .withExif({ IFD0: { Copyright: 'SECRET-EXIF' }, IFD3: { GPSLatitude: '52/1 30/1 0/1' } })
    .withMetadata({ orientation: 6 })
    .toBuffer();
