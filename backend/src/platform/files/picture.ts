import sharp from 'sharp';
import { Rejection } from '#shared/problems/rejection';
import type { Upload } from '../http/call';
import type { NewFile } from './file-store';

/** Kinds of picture taken in, with the endings their names may have. SVG is not among them: it can carry scripts. */
const endings: Readonly<Record<string, readonly string[]>> = { png: ['png'], jpeg: ['jpg', 'jpeg'], webp: ['webp'] };
const mostMegapixels = 60;

export interface PictureWanted {
  /** The longer side is scaled down to this many pixels. */
  readonly longest_pixels: number;
  readonly as: 'png' | 'jpeg';
}

const tooManyPixels = () =>
  new Rejection('too-large', 'picture-too-many-pixels', { values: { megapixels: mostMegapixels } });
const notReadable = () => new Rejection('unsupported', 'picture-not-readable');

/** The name's one ending must fit what is in the file: neither `a.png.php` nor a web page called `photo.jpg`. */
function checkName(name: string, format: string): void {
  const [, ...found] = name.toLowerCase().split('.');
  const fits = found.length > 0 && endings[format]?.includes(found.at(-1) ?? '') && !name.includes('\u0000');
  const hidesAnother = found
    .slice(0, -1)
    .some((ending) => /^(php|exe|html?|svg|js|sh|bat|cmd|jsp|aspx?)\d?$/.test(ending));
  if (!fits || hidesAnother) throw new Rejection('unsupported', 'file-name-not-fitting');
}

/** What the file says of itself; nothing if it is no picture. */
const factsOf = (bytes: Buffer) =>
  Promise.resolve()
    .then(() => sharp(bytes, { limitInputPixels: false }).metadata())
    .catch(() => undefined);

/**
 * A picture from outside, drawn anew: only its pixels are kept, neither metadata nor whatever else was in the file. Refuses what is
 * not a picture, what its name belies, and what would unpack to more than 60 megapixels.
 */
export async function redrawn(upload: Upload | undefined, wanted: PictureWanted): Promise<NewFile> {
  if (!upload)
    throw new Rejection('invalid', 'problem-invalid', {
      complaints: [{ path: ['file'], code: 'upload-missing', values: {} }],
    });
  const facts = await factsOf(upload.bytes);
  if (!facts || !(facts.format in endings)) throw notReadable();
  if (facts.width * facts.height > mostMegapixels * 1_000_000) throw tooManyPixels();
  checkName(upload.name, facts.format);
  const size = {
    width: wanted.longest_pixels,
    height: wanted.longest_pixels,
    fit: 'inside',
    withoutEnlargement: true,
  } as const;
  const drawn = sharp(upload.bytes, { limitInputPixels: mostMegapixels * 1_000_000, failOn: 'error' })
    .rotate()
    .resize(size);
  const bytes = await (
    wanted.as === 'png' ? drawn.png() : drawn.flatten({ background: '#ffffff' }).jpeg({ quality: 85 })
  )
    .toBuffer()
    .catch(() => Promise.reject(notReadable()));
  return { name: upload.name.slice(0, 200), media: `image/${wanted.as}`, bytes };
}
