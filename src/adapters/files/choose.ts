import { makeDiskFiles } from './disk';
import type { FilesPort } from './port';
import { makeS3Files } from './s3';

export interface FilesSettings {
  filesFolder: string;
  /** null: files lie on this machine's disk. */
  s3: {
    endpoint?: string | undefined;
    region: string;
    bucket: string;
    accessKeyId: string;
    secretAccessKey: string;
  } | null;
}

/** The store a setting names. */
export function chooseFiles(settings: FilesSettings): FilesPort {
  return settings.s3 ? makeS3Files(settings.s3) : makeDiskFiles(settings.filesFolder);
}
