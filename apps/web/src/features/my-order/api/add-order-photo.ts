import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { photo } from '#shared/contracts/photos.ts';
import { sendFile } from '#web/lib/send-file.ts';
import { orderQuery } from './get-order.ts';

export function addOrderPhoto(code: string, file: File, onProgress: (share: number) => void) {
  return sendFile({
    path: `/api/orders/${encodeURIComponent(code)}/photos`,
    field: 'photo',
    file,
    name: file.name,
    fields: { kind: 'inspiration', note: '' },
    onProgress,
    answer: photo,
  });
}

/** Adds a picture to one's own order; `share` is how much of it has left the device, 0 to 1. */
export function useAddOrderPhoto(code: string) {
  const client = useQueryClient();
  const [share, setShare] = useState(0);
  const mutation = useMutation({
    mutationFn: (file: File) => addOrderPhoto(code, file, setShare),
    onMutate: () => setShare(0),
    onSuccess: () => client.invalidateQueries({ queryKey: orderQuery(code).queryKey }),
  });
  return { ...mutation, share };
}
