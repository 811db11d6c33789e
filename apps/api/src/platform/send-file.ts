import type { Readable } from 'node:stream';
import { pipeline } from 'node:stream/promises';
import type { Response } from 'express';

export interface FileAnswer {
  contentType: string;
  content: { stream: Readable; size: number } | Buffer;
  /** Suggested name; quotes and control characters are encoded. Given, the file is offered for saving unless `inline`. */
  fileName?: string;
  inline?: boolean;
  /** Content that never changes under its address may be kept by browsers; private by default. */
  cache?: 'immutable' | 'private-immutable' | 'none';
}

const cacheControl = {
  immutable: 'public, max-age=31536000, immutable',
  'private-immutable': 'private, max-age=31536000, immutable',
  none: 'no-store',
} as const;

/** Sends a picture or a document as content only: never sniffed, never run, never framed. */
export async function sendFile(
  res: Response,
  { contentType, content, fileName, inline = false, cache = 'none' }: FileAnswer,
): Promise<void> {
  res.status(200).set({
    'Content-Type': contentType,
    'Cache-Control': cacheControl[cache],
    'X-Content-Type-Options': 'nosniff',
    'Content-Security-Policy': "default-src 'none'; sandbox",
  });
  if (fileName) res.attachment(fileName);
  if (inline)
    res.set('Content-Disposition', res.get('Content-Disposition')?.replace(/^attachment/, 'inline') ?? 'inline');
  if (Buffer.isBuffer(content)) return void res.end(content);
  res.set('Content-Length', String(content.size));
  await pipeline(content.stream, res);
}
