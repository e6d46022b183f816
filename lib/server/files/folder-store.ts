import 'server-only';
import { randomUUID } from 'node:crypto';
import { mkdir, open, readFile, rename, rm } from 'node:fs/promises';
import { dirname, join } from 'node:path';
import { assertKey, type FileStore } from './file-store';

const isMissing = (error: unknown) => error instanceof Error && 'code' in error && error.code === 'ENOENT';

/** Files in a local folder: written aside, put on the disk, and only then given their name. */
export function folderStore(folder: string): FileStore {
  const pathOf = (key: string) => {
    assertKey(key);
    return join(folder, key);
  };
  return {
    async put(key, bytes) {
      const path = pathOf(key);
      await mkdir(dirname(path), { recursive: true, mode: 0o700 });
      const aside = `${path}.${randomUUID()}`;
      const file = await open(aside, 'wx', 0o600);
      try {
        await file.writeFile(bytes);
        await file.sync();
      } catch (error) {
        await rm(aside, { force: true });
        throw error;
      } finally {
        await file.close();
      }
      await rename(aside, path);
    },
    async get(key) {
      try {
        return await readFile(pathOf(key));
      } catch (error) {
        if (isMissing(error)) return undefined;
        throw error;
      }
    },
    async delete(key) {
      await rm(pathOf(key), { force: true });
    },
  };
}
