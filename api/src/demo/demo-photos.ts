import sharp from 'sharp';

/** Drawn stand-ins for photos: parts on a bench, in three views. No camera was there. */
const shapes = [
  '<circle cx="400" cy="300" r="150" fill="#8a9097"/><circle cx="400" cy="300" r="70" fill="#3d444b"/>',
  '<rect x="180" y="210" width="440" height="180" rx="18" fill="#8a9097"/><circle cx="280" cy="300" r="34" fill="#3d444b"/><circle cx="520" cy="300" r="34" fill="#3d444b"/>',
  '<path d="M250 420 L330 160 L470 160 L550 420 Z" fill="#8a9097"/><rect x="360" y="230" width="80" height="120" fill="#3d444b"/>',
];

/** The demo's pictures, as a camera would hand them over. */
export const demoPictures = (): Promise<Buffer[]> =>
  Promise.all(
    shapes.map((shape) =>
      sharp(
        Buffer.from(
          `<svg xmlns="http://www.w3.org/2000/svg" width="800" height="600"><rect width="800" height="600" fill="#c9b79c"/>${shape}</svg>`,
        ),
      )
        .jpeg({ quality: 80 })
        .toBuffer(),
    ),
  );
