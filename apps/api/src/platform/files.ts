import { createReadStream } from 'node:fs';
import { copyFile, mkdir, rename, rm, stat, writeFile } from 'node:fs/promises';
import { dirname, join } from 'node:path';
import type { Readable } from 'node:stream';
import { randomUUID } from 'node:crypto';

/** Keeps bytes under keys such as `photos/<uuid>/page.webp`. Keys are made by the application, never from a sender's file name. */
export interface FileStore {
  put(key: string, bytes: Buffer): Promise<void>;
  read(key: string): Promise<{ stream: Readable; size: number } | null>;
  copy(from: string, to: string): Promise<void>;
  /** Removes a file, or all files under a prefix; what is not there is fine. */
  remove(prefix: string): Promise<void>;
}

const keyPattern = /^[a-z]+(\/[A-Za-z0-9-]+)+(\.[a-z0-9]+)?$/;

/** Files in a folder. A file appears whole or not at all: it is written beside its place and moved. */
export function createFolderStore(folder: string): FileStore {
  const pathOf = (key: string): string => {
    if (!keyPattern.test(key)) throw new RangeError(`Not a key of the file store: ${key}`);
    return join(folder, key);
  };
  return {
    async put(key, bytes) {
      const path = pathOf(key);
      await mkdir(dirname(path), { recursive: true });
      const half = `${path}.${randomUUID()}.part`;
      await writeFile(half, bytes);
      await rename(half, path);
    },
    async read(key) {
      const path = pathOf(key);
      const info = await stat(path).catch(() => null);
      return info && { stream: createReadStream(path), size: info.size };
    },
    async copy(from, to) {
      const path = pathOf(to);
      await mkdir(dirname(path), { recursive: true });
      await copyFile(pathOf(from), path);
    },
    async remove(prefix) {
      await rm(pathOf(prefix), { recursive: true, force: true });
    },
  };
}
