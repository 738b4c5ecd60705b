import type * as z from 'zod/mini';
import { NetworkProblem, ownScriptHeader, refusal } from './http.ts';

export type SendFile<S extends z.ZodMiniType> = {
  readonly path: string;
  /** The form's field that holds the file. */
  readonly field: string;
  readonly file: Blob;
  readonly name: string;
  /** Text fields beside the file. */
  readonly fields?: Readonly<Record<string, string>>;
  /** How much of the file has left the device, 0 to 1. */
  readonly onProgress?: (share: number) => void;
  readonly signal?: AbortSignal;
  readonly answer: S;
};

/** Longest a transfer may stand still before the connection counts as lost. */
const stalledMs = 30_000;

/**
 * Sends one file as a form, by XMLHttpRequest because fetch cannot tell how far an upload has come.
 * Throws `ApiProblem` for a refusal, `NetworkProblem` when the connection was lost or stood still.
 */
export function sendFile<S extends z.ZodMiniType>(options: SendFile<S>): Promise<z.output<S>> {
  const { signal } = options;
  return new Promise((resolve, reject) => {
    const xhr = new XMLHttpRequest();
    let watch: ReturnType<typeof setTimeout> | undefined;
    const lost = (cause: string) => reject(new NetworkProblem(new Error(cause)));
    const alive = () => {
      clearTimeout(watch);
      watch = setTimeout(() => {
        xhr.abort();
        lost('stalled');
      }, stalledMs);
    };
    const stop = () => {
      clearTimeout(watch);
      signal?.removeEventListener('abort', onAbort);
    };
    const onAbort = () => {
      xhr.abort();
      stop();
      const reason: unknown = signal?.reason;
      reject(reason instanceof Error ? reason : new NetworkProblem(reason));
    };

    xhr.upload.addEventListener('progress', (event) => {
      alive();
      if (event.lengthComputable) options.onProgress?.(event.loaded / event.total);
    });
    xhr.addEventListener('error', () => lost('error'));
    xhr.addEventListener('loadend', stop);
    xhr.addEventListener('load', () => {
      const json = jsonOf(xhr.responseText);
      if (xhr.status < 200 || xhr.status >= 300) {
        // A proxy without the API behind it answers for nobody: worth trying again.
        reject(
          xhr.status >= 500
            ? new NetworkProblem(refusal(xhr.status, json))
            : refusal(xhr.status, json),
        );
        return;
      }
      const parsed = options.answer.safeParse(json);
      if (parsed.success) resolve(parsed.data);
      else lost('not the contract');
    });

    signal?.addEventListener('abort', onAbort);
    if (signal?.aborted) {
      onAbort();
      return;
    }
    const form = new FormData();
    for (const [name, value] of Object.entries(options.fields ?? {})) form.append(name, value);
    form.append(options.field, options.file, options.name);
    xhr.open('POST', options.path);
    xhr.setRequestHeader('accept', 'application/json');
    for (const [header, value] of Object.entries(ownScriptHeader)) {
      xhr.setRequestHeader(header, value);
    }
    alive();
    xhr.send(form);
  });
}

function jsonOf(text: string): unknown {
  try {
    return JSON.parse(text);
  } catch {
    return null;
  }
}
