import type { PhotoType } from './photo.entity';

/** Pictures lie in the database; the trigger `photo_no_more_than_twelve` counts with us. */
export const MOST_PHOTOS = 12;

export const PHOTO_BYTES = 6 * 1024 * 1024;

/**
 * What a file is by its first bytes, whatever it calls itself; undefined when it is no picture taken here.
 *
 * @see ISO/IEC 10918-1 (JPEG: FF D8 FF), PNG specification section 5.2, the WebP container (RIFF … WEBP); all from memory
 */
export function photoTypeOf(bytes: Uint8Array): PhotoType | undefined {
  if (startsWith(bytes, [0xff, 0xd8, 0xff])) return 'image/jpeg';
  if (startsWith(bytes, [0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a])) return 'image/png';
  const isRiff = startsWith(bytes, [0x52, 0x49, 0x46, 0x46]);
  return isRiff && startsWith(bytes.subarray(8), [0x57, 0x45, 0x42, 0x50]) ? 'image/webp' : undefined;
}

function startsWith(bytes: Uint8Array, wanted: readonly number[]): boolean {
  return wanted.every((byte, index) => bytes[index] === byte);
}
