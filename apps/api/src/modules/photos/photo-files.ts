import { mkdir, readFile, readdir, rename, rm, stat, writeFile } from 'node:fs/promises';
import path from 'node:path';
import type { EncodedFile } from './encode-photo.ts';

type FileName = { readonly width: number; readonly format: string };

const nameOf = ({ width, format }: FileName) => `${width}.${format}`;
const photosDir = (dataDir: string) => path.join(dataDir, 'photos');

/** Where uploads lie while they are looked at; on the same disk as what is kept. */
export const uploadsDir = (dataDir: string) => path.join(dataDir, 'uploads');

/** Writes a picture's files into a folder of its name, all of them or none. */
export async function writePhotoFiles(
  dataDir: string,
  id: string,
  files: readonly EncodedFile[],
): Promise<void> {
  const folder = path.join(photosDir(dataDir), id);
  const unfinished = path.join(uploadsDir(dataDir), `${id}.folder`);
  await mkdir(unfinished, { recursive: true });
  await mkdir(photosDir(dataDir), { recursive: true });
  for (const file of files) await writeFile(path.join(unfinished, nameOf(file)), file.bytes);
  await rename(unfinished, folder);
}

/** @throws when the file is gone */
export function readPhotoFile(dataDir: string, id: string, file: FileName): Promise<Buffer> {
  return readFile(path.join(photosDir(dataDir), id, nameOf(file)));
}

export async function removePhotoFiles(dataDir: string, id: string): Promise<void> {
  await rm(path.join(photosDir(dataDir), id), { recursive: true, force: true });
}

/** Names of the folders of pictures, whether a row knows them or not, with their age. */
export async function listPhotoFolders(dataDir: string): Promise<{ id: string; madeAt: Date }[]> {
  return listWithAge(photosDir(dataDir));
}

/** Removes what a crash left behind while it was looked at. */
export async function removeOldUploads(dataDir: string, before: Date): Promise<void> {
  for (const { id, madeAt } of await listWithAge(uploadsDir(dataDir))) {
    if (madeAt < before)
      await rm(path.join(uploadsDir(dataDir), id), { recursive: true, force: true });
  }
}

async function listWithAge(folder: string): Promise<{ id: string; madeAt: Date }[]> {
  await mkdir(folder, { recursive: true });
  const names = await readdir(folder);
  return Promise.all(
    names.map(async (id) => ({ id, madeAt: (await stat(path.join(folder, id))).mtime })),
  );
}
