import { FILE_PROBLEMS, FILE_REMARKS } from '../words/files';
import { FileProblem, lineAt } from './file-problem';

const MARKS: { bytes: number[]; encoding: string }[] = [
  { bytes: [0xef, 0xbb, 0xbf], encoding: 'utf-8' },
  { bytes: [0xff, 0xfe], encoding: 'utf-16le' },
  { bytes: [0xfe, 0xff], encoding: 'utf-16be' },
];

function markedEncoding(bytes: Uint8Array): string | null {
  const mark = MARKS.find((one) => one.bytes.every((byte, i) => bytes[i] === byte));
  if (mark) return mark.encoding;
  if (bytes[0] === 0x3c && bytes[1] === 0) return 'utf-16le';
  if (bytes[0] === 0 && bytes[1] === 0x3c) return 'utf-16be';
  return null;
}

/** XML says its own encoding in its first line. */
function declaredEncoding(bytes: Uint8Array): string | null {
  const head = new TextDecoder('latin1').decode(bytes.subarray(0, 200));
  return /^\s*<\?xml[^>]*\sencoding\s*=\s*["']([\w.-]+)["']/.exec(head)?.[1] ?? null;
}

function firstBadLine(bytes: Uint8Array): number {
  const lax = new TextDecoder('utf-8').decode(bytes);
  return lineAt(lax, Math.max(0, lax.indexOf('\ufffd')));
}

export interface DecodedText {
  text: string;
  remarks: string[];
}

/** Bytes as text: by their mark, else as XML declares, else UTF-8. A table that is no UTF-8 is taken as Windows Western. */
export function decodeText(bytes: Uint8Array, kind: 'xml' | 'json' | 'csv'): DecodedText {
  const encoding = markedEncoding(bytes) ?? (kind === 'xml' ? declaredEncoding(bytes) : null) ?? 'utf-8';
  let decoder: TextDecoder;
  try {
    decoder = new TextDecoder(encoding, { fatal: true });
  } catch {
    throw new FileProblem(FILE_PROBLEMS.encoding(encoding.slice(0, 40)));
  }
  try {
    return { text: decoder.decode(bytes), remarks: [] };
  } catch {
    if (kind === 'csv' && encoding === 'utf-8') {
      return { text: new TextDecoder('windows-1252').decode(bytes), remarks: [FILE_REMARKS.western] };
    }
    const name = encoding.toUpperCase();
    throw new FileProblem(
      name === 'UTF-8' ? FILE_PROBLEMS.badBytesOn(firstBadLine(bytes), name) : FILE_PROBLEMS.badBytes(name),
    );
  }
}
