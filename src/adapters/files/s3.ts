import {
  DeleteObjectsCommand,
  GetObjectCommand,
  ListObjectsV2Command,
  NoSuchKey,
  PutObjectCommand,
  S3Client,
} from '@aws-sdk/client-s3';
import { checkKey, type FilesPort, type KeptFile } from './port';

export interface S3Options {
  /** Left out: Amazon's own. */
  endpoint?: string | undefined;
  region: string;
  bucket: string;
  accessKeyId: string;
  secretAccessKey: string;
}

/** Keys that one request removes at most. */
const MOST_REMOVED = 1000;

/** Files in a bucket of any store that speaks S3. */
export function makeS3Files({ endpoint, region, bucket, accessKeyId, secretAccessKey }: S3Options): FilesPort {
  const client = new S3Client({
    region,
    ...(endpoint ? { endpoint, forcePathStyle: true } : {}),
    credentials: { accessKeyId, secretAccessKey },
    // Stores other than Amazon's do not all know the newer checksums.
    requestChecksumCalculation: 'WHEN_REQUIRED',
    responseChecksumValidation: 'WHEN_REQUIRED',
  });
  return {
    source: 's3',
    async put(key, bytes, type) {
      await client.send(new PutObjectCommand({ Bucket: bucket, Key: checkKey(key), Body: bytes, ContentType: type }));
    },
    async get(key) {
      try {
        const { Body } = await client.send(new GetObjectCommand({ Bucket: bucket, Key: checkKey(key) }));
        return Body ? await Body.transformToByteArray() : null;
      } catch (error) {
        if (error instanceof NoSuchKey) return null;
        throw error;
      }
    },
    async remove(keys) {
      for (let from = 0; from < keys.length; from += MOST_REMOVED) {
        const Objects = keys.slice(from, from + MOST_REMOVED).map((key) => ({ Key: checkKey(key) }));
        await client.send(new DeleteObjectsCommand({ Bucket: bucket, Delete: { Objects, Quiet: true } }));
      }
    },
    async *list(prefix): AsyncIterable<KeptFile> {
      let next: string | undefined;
      do {
        const page = await client.send(
          new ListObjectsV2Command({ Bucket: bucket, Prefix: prefix, ...(next ? { ContinuationToken: next } : {}) }),
        );
        for (const { Key, LastModified } of page.Contents ?? []) {
          if (Key) yield { key: Key, writtenAt: LastModified?.getTime() ?? 0 };
        }
        next = page.IsTruncated ? page.NextContinuationToken : undefined;
      } while (next);
    },
  };
}
