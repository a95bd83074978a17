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
    throw new FileProblem(`Line 1 says the text is "${encoding.slice(0, 40)}", which is not known. Save it as UTF-8.`);
  }
  try {
    return { text: decoder.decode(bytes), remarks: [] };
  } catch {
    if (kind === 'csv' && encoding === 'utf-8') {
      const remark = 'The text is not UTF-8: it was read as Windows Western. Look whether the names are right.';
      return { text: new TextDecoder('windows-1252').decode(bytes), remarks: [remark] };
    }
    const line = encoding.toLowerCase() === 'utf-8' ? `Line ${firstBadLine(bytes)} holds` : 'The file holds';
    throw new FileProblem(`${line} bytes that are no ${encoding.toUpperCase()} text. Save it as UTF-8 and try again.`);
  }
}
