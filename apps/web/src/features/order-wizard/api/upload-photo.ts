import { uploadedPhoto, type UploadedPhoto } from '#shared/contracts/photos.ts';
import { sendFile } from '#web/lib/send-file.ts';

type Options = {
  /** How much of the file has left the device, 0 to 1. */
  readonly onProgress: (share: number) => void;
  readonly signal: AbortSignal;
};

/**
 * `POST /api/photos`: a picture before the order exists, and the key that claims it. Throws
 * `ApiProblem` for a refusal, `NetworkProblem` when the connection was lost or stood still.
 */
export function uploadPhoto(file: Blob, name: string, options: Options): Promise<UploadedPhoto> {
  return sendFile({
    path: '/api/photos',
    field: 'photo',
    file,
    name,
    answer: uploadedPhoto,
    ...options,
  });
}
