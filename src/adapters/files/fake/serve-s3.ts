import { createServer, type IncomingMessage, type Server } from 'node:http';

export interface FakeS3 {
  url: string;
  objects: Map<string, { bytes: Buffer; type: string; at: number }>;
  stop: () => Promise<void>;
}

/** Objects to a page of a listing: few, so that paging is met. */
const PAGE = 2;

async function bodyOf(request: IncomingMessage): Promise<Buffer> {
  const chunks: Buffer[] = [];
  for await (const chunk of request) chunks.push(Buffer.from(chunk));
  return Buffer.concat(chunks);
}

const xml = (inside: string) => `<?xml version="1.0" encoding="UTF-8"?>${inside}`;

function listing(objects: FakeS3['objects'], query: URLSearchParams): string {
  const after = query.get('continuation-token') ?? '';
  const keys = [...objects.keys()].filter((key) => key.startsWith(query.get('prefix') ?? '') && key > after).sort();
  const page = keys.slice(0, PAGE);
  const more = keys.length > page.length;
  const contents = page.map((key) => {
    const at = new Date(objects.get(key)?.at ?? 0).toISOString();
    return `<Contents><Key>${key}</Key><LastModified>${at}</LastModified><Size>1</Size></Contents>`;
  });
  const next = more ? `<NextContinuationToken>${page.at(-1)}</NextContinuationToken>` : '';
  return xml(`<ListBucketResult><IsTruncated>${more}</IsTruncated>${next}${contents.join('')}</ListBucketResult>`);
}

/** A store of objects in memory that answers the requests of the S3 SDK which the files port makes, for one bucket. */
export async function serveFakeS3(bucket: string): Promise<FakeS3> {
  const objects: FakeS3['objects'] = new Map();
  const server: Server = createServer(async (request, response) => {
    const url = new URL(request.url ?? '/', 'http://127.0.0.1');
    const [, named, ...rest] = decodeURIComponent(url.pathname).split('/');
    const key = rest.join('/');
    const body = await bodyOf(request);
    const fail = (status: number, code: string) =>
      response.writeHead(status, { 'Content-Type': 'application/xml' }).end(xml(`<Error><Code>${code}</Code></Error>`));
    if (!request.headers.authorization?.startsWith('AWS4-HMAC-SHA256')) return fail(403, 'AccessDenied');
    if (named !== bucket) return fail(404, 'NoSuchBucket');
    if (request.method === 'PUT') {
      objects.set(key, { bytes: body, type: request.headers['content-type'] ?? '', at: Date.now() });
      return response.writeHead(200).end();
    }
    if (request.method === 'POST' && url.searchParams.has('delete')) {
      for (const [, gone] of body.toString().matchAll(/<Key>([^<]*)<\/Key>/g)) objects.delete(gone ?? '');
      return response.writeHead(200, { 'Content-Type': 'application/xml' }).end(xml('<DeleteResult></DeleteResult>'));
    }
    if (request.method === 'GET' && key === '') {
      return response.writeHead(200, { 'Content-Type': 'application/xml' }).end(listing(objects, url.searchParams));
    }
    const found = objects.get(key);
    if (request.method !== 'GET' || !found) return fail(404, 'NoSuchKey');
    return response
      .writeHead(200, { 'Content-Type': found.type, 'Content-Length': found.bytes.length })
      .end(found.bytes);
  });
  await new Promise<void>((done) => server.listen(0, '127.0.0.1', done));
  const address = server.address();
  if (address === null || typeof address === 'string') throw new Error('The store has no port.');
  return {
    url: `http://127.0.0.1:${address.port}`,
    objects,
    stop: async () => {
      server.closeAllConnections();
      await new Promise((done) => server.close(done));
    },
  };
}
