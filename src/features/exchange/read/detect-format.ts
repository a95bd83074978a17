import { FILE_PROBLEMS } from '../words/files';
import { FileProblem } from './file-problem';
import type { FileFormat } from './raw-thing';

/** What a file is by what it holds: its name and what the browser calls it count for nothing. */
export function detectFormat(bytes: Uint8Array): FileFormat {
  if (bytes.length === 0) throw new FileProblem(FILE_PROBLEMS.empty);
  if (bytes[0] === 0x50 && bytes[1] === 0x4b && bytes[2] === 3 && bytes[3] === 4) return 'kmz';
  const wide = (bytes[0] === 0xff && bytes[1] === 0xfe) || (bytes[0] === 0x3c && bytes[1] === 0);
  const wideBig = (bytes[0] === 0xfe && bytes[1] === 0xff) || (bytes[0] === 0 && bytes[1] === 0x3c);
  const encoding = wide ? 'utf-16le' : wideBig ? 'utf-16be' : 'utf-8';
  const head = new TextDecoder(encoding)
    .decode(bytes.subarray(0, 8192))
    .replace(/^\ufeff/, '')
    .trimStart();
  if (head === '') throw new FileProblem(FILE_PROBLEMS.blank);
  if (/(?![\t\n\v\f\r])\p{Cc}/u.test(head)) {
    throw new FileProblem(FILE_PROBLEMS.noMap);
  }
  if (head.startsWith('{') || head.startsWith('[')) return 'geojson';
  if (!head.startsWith('<')) return 'csv';
  if (/<(\w+:)?gpx[\s/>]/i.test(head)) return 'gpx';
  if (/<(\w+:)?kml[\s/>]/i.test(head)) return 'kml';
  throw new FileProblem(FILE_PROBLEMS.otherXml);
}
