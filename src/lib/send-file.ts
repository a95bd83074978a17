import { REQUEST_WORDS } from './words';
export type Sent<T> = { ok: true; data: T } | { ok: false; message: string };

function messageOf(text: string): string {
  try {
    const body: { error?: { message?: unknown } } = JSON.parse(text);
    return typeof body.error?.message === 'string' ? body.error.message : REQUEST_WORDS.lookAtConnection;
  } catch {
    return REQUEST_WORDS.lookAtConnection;
  }
}

/** Posts a file as it is, telling how much has gone (0 to 1): fetch tells nothing of that. */
export function sendFile<T>(address: string, file: Blob, onSent: (share: number) => void): Promise<Sent<T>> {
  return new Promise((done) => {
    const request = new XMLHttpRequest();
    request.open('POST', address);
    request.setRequestHeader('Content-Type', 'application/octet-stream');
    request.upload.onprogress = ({ loaded, total }) => onSent(total > 0 ? loaded / total : 0);
    request.upload.onload = () => onSent(1);
    request.onload = () => {
      if (request.status >= 200 && request.status < 300) done({ ok: true, data: JSON.parse(request.responseText) });
      else done({ ok: false, message: messageOf(request.responseText) });
    };
    request.onerror = () => done({ ok: false, message: REQUEST_WORDS.lookAtConnection });
    request.onabort = () => done({ ok: false, message: REQUEST_WORDS.lookAtConnection });
    request.send(file);
  });
}
