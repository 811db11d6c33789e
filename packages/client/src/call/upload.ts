import type { AnswerOf, ParamsOf, Route } from '@lydite/contracts';
import { networkError, type ApiError } from './api-error.ts';
import { addressOf, read } from './call.ts';
import { renewIfDue } from './renew.ts';

export interface UploadOptions {
  fields?: Record<string, string>;
  /** Share of the bytes sent, 0 … 1. */
  onProgress?: (share: number) => void;
  signal?: AbortSignal;
}

/**
 * Sends one photo and reports how far it is: `fetch` cannot, so this is the one place with an XMLHttpRequest.
 * @throws ApiError; a DOMException named AbortError when cancelled
 */
export async function upload<K extends Route>(
  route: K,
  params: ParamsOf<K>,
  photo: Blob,
  options: UploadOptions = {},
): Promise<AnswerOf<K>> {
  await renewIfDue(route);
  const form = new FormData();
  for (const [name, value] of Object.entries(options.fields ?? {})) form.set(name, value);
  form.set('photo', photo);
  return (await post(addressOf(route, params as object), form, options)) as AnswerOf<K>;
}

function post(url: string, form: FormData, { onProgress, signal }: UploadOptions): Promise<unknown> {
  return new Promise((resolve, reject: (error: ApiError | DOMException) => void) => {
    const request = new XMLHttpRequest();
    request.open('POST', url);
    request.setRequestHeader('x-lydite-client', 'web');
    request.upload.onprogress = (event) => event.lengthComputable && onProgress?.(event.loaded / event.total);
    request.onerror = () => reject(networkError());
    request.onabort = () => reject(new DOMException('The upload was cancelled.', 'AbortError'));
    request.onload = () => {
      const headers = { 'content-type': request.getResponseHeader('content-type') ?? '' };
      read(new Response(request.responseText, { status: request.status, headers })).then(resolve, reject);
    };
    signal?.addEventListener('abort', () => request.abort(), { once: true });
    request.send(form);
  });
}
