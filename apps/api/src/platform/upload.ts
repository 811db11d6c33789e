import { mkdirSync } from 'node:fs';
import { rm } from 'node:fs/promises';
import type { RequestHandler } from 'express';
import multer from 'multer';

/** Documented in DEVELOPERS.md; a test reads both. */
export const uploadLimits = { fileBytes: 25 * 1024 * 1024, files: 1, fields: 4, fieldBytes: 1024 } as const;

/**
 * Takes one file named `photo` to a quarantine folder under a random name; nothing of the sender's name reaches the disk.
 * The file is removed when the answer is sent or the caller gone, whatever came of it.
 */
export function createUpload(folder: string): RequestHandler {
  mkdirSync(folder, { recursive: true });
  const receive = multer({
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
  return (req, res, next) => {
    res.once('close', () => {
      if (req.file) void rm(req.file.path, { force: true });
    });
    receive(req, res, next);
  };
}
