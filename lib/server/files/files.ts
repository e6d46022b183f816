import 'server-only';
import { join } from 'node:path';
import { environment } from '../environment';
import type { FileStore } from './file-store';
import { folderStore } from './folder-store';
import { s3Store } from './s3-store';

let chosen: FileStore | undefined;

/** The file store of this installation: S3 where it is configured, else a folder beside the local database. */
export function files(): FileStore {
  if (chosen) return chosen;
  const { S3_ENDPOINT, S3_BUCKET, S3_REGION, S3_ACCESS_KEY_ID, S3_SECRET_ACCESS_KEY, PHOTO_FOLDER } = environment();
  chosen =
    S3_ENDPOINT && S3_BUCKET && S3_REGION && S3_ACCESS_KEY_ID && S3_SECRET_ACCESS_KEY
      ? s3Store({ endpoint: S3_ENDPOINT, bucket: S3_BUCKET, region: S3_REGION, accessKeyId: S3_ACCESS_KEY_ID, secretAccessKey: S3_SECRET_ACCESS_KEY })
      : folderStore(PHOTO_FOLDER ?? join(process.cwd(), '.rowrise', 'photos'));
  return chosen;
}
