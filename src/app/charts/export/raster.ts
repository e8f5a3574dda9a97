import { type Picture, pictureText } from './picture';

/** Dots for each CSS pixel. */
const SCALE = 2;

/** A picture as PNG, at twice the size of the page. */
export async function pictureAsPng(picture: Picture): Promise<Blob> {
  const image = new Image();
  image.src = `data:image/svg+xml;charset=utf-8,${encodeURIComponent(pictureText(picture))}`;
  await image.decode();
  const canvas = document.createElement('canvas');
  canvas.width = picture.width * SCALE;
  canvas.height = picture.height * SCALE;
  canvas.getContext('2d')?.drawImage(image, 0, 0, canvas.width, canvas.height);
  return new Promise((resolve, reject) => {
    canvas.toBlob((blob) => {
      if (blob) resolve(blob);
      else reject(new Error('The picture cannot be drawn.'));
    }, 'image/png');
  });
}
