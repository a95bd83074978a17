import { readImport } from '@/features/exchange/read-import';
import { takeUpload } from '@/features/exchange/take-upload';
import { TEST_NOW, type TestMember } from './make-club';

/** Sends a file as the screen does; gives the import it became. */
export async function upload(member: TestMember, name: string, body: string | Buffer): Promise<string> {
  const request = new Request('http://127.0.0.1/', {
    method: 'POST',
    body: typeof body === 'string' ? body : new Uint8Array(body),
  });
  return (await takeUpload(member.scope, { name, request }, TEST_NOW)).id;
}

/** The rows of a file that would be added as they are guessed. */
export async function guessed(member: TestMember, id: string) {
  const view = await readImport(member.scope, id);
  const rows = view.rows.filter((row) => row.kind !== '' && row.twins.length === 0 && row.problem === null);
  return { view, rows: rows.map(({ row, kind }) => ({ row, kind })) };
}
