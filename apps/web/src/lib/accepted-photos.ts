/**
 * For a file input's `accept`: what the photo pipeline reads. HEIC is left out on purpose, since a
 * phone that keeps it then turns the picture into one of these by itself.
 */
export const acceptedPhotos = 'image/jpeg,image/png,image/webp,image/avif,image/gif';
