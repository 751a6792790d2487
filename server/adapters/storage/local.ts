import { mkdir, open, readFile, rename } from 'node:fs/promises';
import path from 'node:path';
import type { Storage } from '../../ports/storage';

const SAFE = /^[\w-]{8,64}\.\w{3,4}$/;

/** Files in a folder; written beside and renamed, so that a name never stands for half a file. */
export function localStorage(folder: string): Storage {
  const place = (name: string): string => {
    if (!SAFE.test(name)) throw new Error('not a name of this storage');
    return path.join(folder, name);
  };
  return {
    async put(name, bytes) {
      await mkdir(folder, { recursive: true });
      const beside = `${place(name)}.part`;
      const file = await open(beside, 'w', 0o600);
      try {
        await file.writeFile(bytes);
        await file.sync();
      } finally {
        await file.close();
      }
      await rename(beside, place(name));
    },
    async get(name) {
      try {
        return await readFile(place(name));
      } catch (error) {
        if (error instanceof Error && 'code' in error && error.code === 'ENOENT') return null;
        throw error;
      }
    },
  };
}
