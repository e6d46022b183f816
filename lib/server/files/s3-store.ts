import 'server-only';
import { AwsClient } from 'aws4fetch';
import { AppError } from '@/lib/errors/app-error';
import { assertKey, type FileStore } from './file-store';

export type S3Settings = { endpoint: string; bucket: string; region: string; accessKeyId: string; secretAccessKey: string };

const patienceMilliseconds = 20_000;

/** Files in a store that speaks the S3 protocol, with the bucket in the path. A store that is away is busy, and nothing is noted. */
export function s3Store({ endpoint, bucket, region, accessKeyId, secretAccessKey }: S3Settings): FileStore {
  const client = new AwsClient({ accessKeyId, secretAccessKey, region, service: 's3', retries: 1 });
  const ask = async (key: string, init: { method: string; body?: Uint8Array; contentType?: string }) => {
    assertKey(key);
    const request = {
      method: init.method,
      ...(init.body ? { body: init.body as BodyInit } : {}),
      ...(init.contentType ? { headers: { 'Content-Type': init.contentType } } : {}),
      signal: AbortSignal.timeout(patienceMilliseconds),
    };
    try {
      return await client.fetch(`${endpoint.replace(/\/$/, '')}/${bucket}/${key}`, request);
    } catch {
      throw new AppError('busy');
    }
  };
  return {
    async put(key, bytes, contentType) {
      const response = await ask(key, { method: 'PUT', body: bytes, contentType });
      if (!response.ok) throw new AppError('busy');
    },
    async get(key) {
      const response = await ask(key, { method: 'GET' });
      if (response.status === 404) return undefined;
      if (!response.ok) throw new AppError('busy');
      return new Uint8Array(await response.arrayBuffer());
    },
    async delete(key) {
      const response = await ask(key, { method: 'DELETE' });
      if (!response.ok && response.status !== 404) throw new AppError('busy');
    },
  };
}
