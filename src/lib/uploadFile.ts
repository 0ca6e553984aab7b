import { storedFileSchema, type StoredFile } from '../../shared/schemas/files';
import { makeIdempotencyKey } from './idempotencyKey';
import { ApiProblem, makeBrokenProblem, makeOfflineProblem } from './problem';

export interface UploadOptions {
  /** Called with 0 to 1 while bytes go out. */
  onProgress?: ((share: number) => void) | undefined;
  signal?: AbortSignal | undefined;
  /** Default `/files`; the public page uploads beside its own tag. */
  path?: string | undefined;
}

/** Sends one file. XHR, because fetch tells nothing about how far an upload is. @throws ApiProblem */
export function uploadFile(file: File, options: UploadOptions = {}): Promise<StoredFile> {
  return new Promise((resolve, reject) => {
    const request = new XMLHttpRequest();
    request.open('POST', `/api${options.path ?? '/files'}`);
    request.setRequestHeader('Accept', 'application/json');
    request.setRequestHeader('Idempotency-Key', makeIdempotencyKey());
    request.upload.onprogress = (event) => {
      if (event.lengthComputable) options.onProgress?.(event.loaded / event.total);
    };
    request.onload = () => {
      const answer = parseJson(request.responseText);
      if (request.status < 200 || request.status > 299) {
        reject(new ApiProblem('refused', request.status, answer, request.getResponseHeader('Retry-After')));
        return;
      }
      const parsed = storedFileSchema.safeParse(answer);
      if (parsed.success) resolve(parsed.data);
      else reject(makeBrokenProblem(request.status));
    };
    request.onerror = () => reject(makeOfflineProblem());
    request.onabort = () => reject(new DOMException('Upload stopped', 'AbortError'));
    options.signal?.addEventListener('abort', () => request.abort(), { once: true });
    const form = new FormData();
    form.append('file', file);
    request.send(form);
  });
}

function parseJson(text: string): unknown {
  try {
    return JSON.parse(text) as unknown;
  } catch {
    return {};
  }
}
