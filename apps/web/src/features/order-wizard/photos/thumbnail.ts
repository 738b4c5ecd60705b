const longestSide = 240;

/**
 * A small JPEG of a picture as a data address, for the draft: the server shows nobody a photo
 * before its order exists. Null where this browser cannot read the file (HEIC in most).
 */
export async function thumbnailOf(file: Blob): Promise<string | null> {
  if (typeof createImageBitmap !== 'function') return null;
  let bitmap: ImageBitmap;
  try {
    bitmap = await createImageBitmap(file);
  } catch {
    return null;
  }
  const scale = Math.min(1, longestSide / Math.max(bitmap.width, bitmap.height));
  const canvas = document.createElement('canvas');
  canvas.width = Math.max(1, Math.round(bitmap.width * scale));
  canvas.height = Math.max(1, Math.round(bitmap.height * scale));
  const context = canvas.getContext('2d');
  context?.drawImage(bitmap, 0, 0, canvas.width, canvas.height);
  bitmap.close();
  return context === null ? null : canvas.toDataURL('image/jpeg', 0.72);
}
