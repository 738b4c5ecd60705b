import { uploadedPhoto, type UploadedPhoto } from '#shared/contracts/photos.ts';
import { NetworkProblem, ownScriptHeader, refusal } from '#web/lib/http.ts';

type Options = {
  /** How much of the file has left the device, 0 to 1. */
  readonly onProgress: (share: number) => void;
  readonly signal: AbortSignal;
};

/** Longest a transfer may stand still before the connection counts as lost. */
const stalledMs = 30_000;

/**
 * `POST /api/photos`, by XMLHttpRequest because fetch cannot tell how far an upload has come.
 * Throws `ApiProblem` for a refusal, `NetworkProblem` when the connection was lost or stood still.
 */
export function uploadPhoto(file: Blob, name: string, options: Options): Promise<UploadedPhoto> {
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
      options.signal.removeEventListener('abort', onAbort);
    };
    const onAbort = () => {
      xhr.abort();
      stop();
      reject(options.signal.reason);
    };

    xhr.upload.addEventListener('progress', (event) => {
      alive();
      if (event.lengthComputable) options.onProgress(event.loaded / event.total);
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
      const parsed = uploadedPhoto.safeParse(json);
      if (parsed.success) resolve(parsed.data);
      else lost('not the contract');
    });

    options.signal.addEventListener('abort', onAbort);
    if (options.signal.aborted) {
      onAbort();
      return;
    }
    const form = new FormData();
    form.append('photo', file, name);
    xhr.open('POST', '/api/photos');
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
