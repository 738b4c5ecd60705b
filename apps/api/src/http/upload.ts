import { mkdir, rm } from 'node:fs/promises';
import path from 'node:path';
import type { Request, RequestHandler, Response } from 'express';
import multer, { MulterError } from 'multer';
import { AppError } from '#api/platform/app-error.ts';
import { logOf } from './request-log.ts';

export type UploadOptions = {
  /** Form field of the file. */
  readonly field: string;
  /** Folder for the bytes while they are looked at; on the disk the results go to. */
  readonly folder: string;
  readonly maxBytes: number;
};

/**
 * Receives one file into a temporary place for `useUpload`, and removes it whatever the answer is.
 * Its name and its declared type are not looked at.
 */
export function receiveUpload({ field, folder, maxBytes }: UploadOptions): RequestHandler {
  const receive = multer({
    storage: multer.diskStorage({
      destination: (_request, _file, done) => {
        mkdir(folder, { recursive: true }).then(
          () => done(null, folder),
          (error: unknown) => done(error instanceof Error ? error : new Error('No folder'), folder),
        );
      },
    }),
    limits: { fileSize: maxBytes, files: 1, fields: 4, fieldSize: 2000, parts: 6 },
  }).single(field);
  return (request, response, next) => {
    removeAfter(request, response);
    receive(request, response, (error: unknown) => {
      next(error === undefined || error === null ? undefined : refusalOf(error, maxBytes));
    });
  };
}

/**
 * Does something with the received file; its bytes are gone before the answer leaves.
 * @throws `invalid-input` when none was sent
 */
export async function useUpload<T>(
  request: Request,
  field: string,
  work: (file: string) => Promise<T>,
): Promise<T> {
  const { file } = request;
  if (file === undefined) {
    throw new AppError('invalid-input', {
      issues: [{ path: [field], message: 'Choose a picture first.' }],
    });
  }
  try {
    return await work(path.resolve(file.path));
  } finally {
    await rm(file.path, { force: true });
  }
}

/** Where it was refused before anybody used it. */
function removeAfter(request: Request, response: Response): void {
  response.once('close', () => {
    if (request.file === undefined) return;
    rm(request.file.path, { force: true }).catch((error: unknown) =>
      logOf(request).warn({ err: error }, 'an upload was left behind'),
    );
  });
}

function refusalOf(error: unknown, maxBytes: number): unknown {
  if (error instanceof MulterError && error.code === 'LIMIT_FILE_SIZE') {
    return new AppError('too-large', {
      detail: `A photo may have up to ${Math.floor(maxBytes / 1024 ** 2)} MB. Phones can send a smaller one.`,
    });
  }
  // The disk's own errors carry a code; what the form's reader throws does not.
  if (!(error instanceof MulterError) && error instanceof Error && 'code' in error) return error;
  return new AppError('bad-request', {
    detail: 'The upload was cut short or is not a form. Please send the photo again.',
    cause: error,
  });
}
