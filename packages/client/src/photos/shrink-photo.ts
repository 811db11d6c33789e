const longSidePx = 3200;
const quality = 0.85;

/**
 * Makes a photo small enough for a slow link: at most 3,200 pixels on its long side, as JPEG. What the browser can't read, or
 * what is small already, goes as it is; the server looks at the bytes all the same.
 */
export async function shrinkPhoto(photo: File): Promise<Blob> {
  const bitmap = await createImageBitmap(photo).catch(() => null);
  if (!bitmap) return photo;
  const scale = longSidePx / Math.max(bitmap.width, bitmap.height);
  if (scale >= 1) return photo;
  const canvas = document.createElement('canvas');
  canvas.width = Math.round(bitmap.width * scale);
  canvas.height = Math.round(bitmap.height * scale);
  canvas.getContext('2d')?.drawImage(bitmap, 0, 0, canvas.width, canvas.height);
  bitmap.close();
  const smaller = await new Promise<Blob | null>((resolve) => canvas.toBlob(resolve, 'image/jpeg', quality));
  return smaller ?? photo;
}
