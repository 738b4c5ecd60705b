import { useMutation, useQueryClient } from '@tanstack/react-query';
import { type Photo, photo } from '#shared/contracts/photos.ts';
import { sendFile } from '#web/lib/send-file.ts';
import { orderChanged } from '#web/lib/staff-keys.ts';

export type NewPhoto = {
  readonly file: File;
  readonly kind: Photo['kind'];
  readonly note: string;
  readonly onProgress: (share: number) => void;
};

/** A picture of the studio's own to an order: the finished cake, its handover, a fault. */
export function addOrderPhoto(number: number, { file, kind, note, onProgress }: NewPhoto) {
  return sendFile({
    path: `/api/staff/orders/${number}/photos`,
    field: 'photo',
    file,
    name: file.name,
    fields: { kind, note },
    onProgress,
    answer: photo,
  });
}

export function useAddOrderPhoto(number: number) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (added: NewPhoto) => addOrderPhoto(number, added),
    onSuccess: () => orderChanged(client),
  });
}
