const LONGEST_SIDE = 1600;
const QUALITY = 0.82;

/** A picture made small enough to send from an anchorage, drawn anew, which leaves the place it was taken behind. @throws Error with words to show */
export async function shrinkPhoto(file: Blob): Promise<Blob> {
  const picture = await createImageBitmap(file).catch(() => {
    throw new Error("This picture cannot be read here. A JPEG or PNG will do.");
  });
  const scale = Math.min(1, LONGEST_SIDE / Math.max(picture.width, picture.height));
  const canvas = document.createElement("canvas");
  canvas.width = Math.max(1, Math.round(picture.width * scale));
  canvas.height = Math.max(1, Math.round(picture.height * scale));
  canvas.getContext("2d")?.drawImage(picture, 0, 0, canvas.width, canvas.height);
  picture.close();
  return new Promise((done, failed) => {
    canvas.toBlob((blob) => (blob ? done(blob) : failed(new Error("This picture could not be made smaller."))), "image/jpeg", QUALITY);
  });
}
