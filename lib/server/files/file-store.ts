import 'server-only';

/** Where files lie: a folder of this machine, or a store that several servers share. Keys are `<organisation>/<id>…`. */
export type FileStore = {
  /** Keeps the bytes under the key; the same key again replaces them whole, never in part. */
  put: (key: string, bytes: Uint8Array, contentType: string) => Promise<void>;
  /** Undefined where nothing is kept under the key. */
  get: (key: string) => Promise<Uint8Array | undefined>;
  delete: (key: string) => Promise<void>;
};

const keyPattern = /^[0-9a-f-]{36}\/[0-9a-z-]{1,60}\.jpg$/;

/** Keys are made of ids; anything else would be a way out of the folder. */
export function assertKey(key: string): void {
  if (!keyPattern.test(key)) throw new RangeError('A file key is an organisation, an id and .jpg.');
}
