import multer from 'multer'
import sharp from 'sharp'
import { limits } from '#shared/domain/limits.ts'
import { fieldError } from '../http/api-error.ts'

/** Takes one file named `photo` into memory. */
export const takePhoto = multer({
  storage: multer.memoryStorage(),
  limits: { fileSize: limits.photoBytes, files: 1, fields: 4, parts: 6 },
}).single('photo')

export interface Photo {
  mediaType: 'image/webp'
  width: number
  height: number
  bytes: Buffer
}

const formats = new Set(['jpeg', 'png', 'webp', 'heif', 'tiff', 'gif'])
const longestSide = 1600

/**
 * A photograph made fit to show: its type told by its content, turned upright, at most 1600 pixels on the longer side,
 * written anew so that no metadata (place, device, names) goes along.
 * @throws a fault at `photo` for anything that is not a picture or too large in pixels
 */
export async function readPhoto(bytes: Buffer): Promise<Photo> {
  const source = sharp(bytes, { limitInputPixels: false, failOn: 'error', pages: 1 })
  const about = await source.metadata().catch(() => {
    throw fieldError('photo', 'This file is not a picture that Scrim can read. JPEG, PNG and WebP are.')
  })
  if (!formats.has(about.format ?? ''))
    throw fieldError('photo', 'This kind of picture cannot be read. JPEG, PNG and WebP can.')
  if ((about.width ?? 0) * (about.height ?? 0) > limits.photoPixels)
    throw fieldError('photo', 'This picture has too many pixels. Make it smaller than 50 megapixels.')
  try {
    const { data, info } = await source
      .rotate()
      .resize({ width: longestSide, height: longestSide, fit: 'inside', withoutEnlargement: true })
      .webp({ quality: 82 })
      .toBuffer({ resolveWithObject: true })
    return { mediaType: 'image/webp', width: info.width, height: info.height, bytes: data }
  } catch {
    throw fieldError('photo', 'This picture is damaged and cannot be read to its end.')
  }
}
