import { mkdirSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { RequestHandler } from 'express';
import multer from 'multer';

/** Documented in DEVELOPERS.md; a test reads both. */
export const uploadLimits = { fileBytes: 25 * 1024 * 1024, files: 1, fields: 4, fieldBytes: 1024 } as const;

/** Takes one file named `photo` to a quarantine folder under a random name; nothing of the sender's name reaches the disk. */
export function createUpload(folder = join(tmpdir(), 'lydite-quarantine')): RequestHandler {
  mkdirSync(folder, { recursive: true });
  return multer({
    dest: folder,
    limits: {
      fileSize: uploadLimits.fileBytes,
      files: uploadLimits.files,
      fields: uploadLimits.fields,
      parts: uploadLimits.files + uploadLimits.fields,
      fieldSize: uploadLimits.fieldBytes,
      fieldNameSize: 50,
      headerPairs: 50,
    },
  }).single('photo');
}
