import "server-only";
import { fileTypeFromBuffer } from "file-type";
import sharp from "sharp";

export const MAX_UPLOAD_BYTES = 8 * 1024 * 1024;
/** More than any phone's camera takes in one shot; a small file that unfolds into more is an attack. */
const MAX_PIXELS = 64_000_000;
const LONGEST_SIDE = 2400;
const FORMATS = ["jpeg", "png", "webp"];
const MIME_TYPES = ["image/jpeg", "image/png", "image/webp"];

export type Picture = { body: Buffer; type: "image/jpeg"; width: number; height: number };
export type PictureRefusal = { refused: "too-large" | "not-a-picture" | "heic" | "too-many-pixels" | "damaged"; says: string };

/**
 * Reads an uploaded picture and writes it anew as JPEG: what comes out holds
 * the pixels, upright, and nothing of what the camera wrote beside them (place,
 * owner, thumbnail), nor of what somebody hid behind them. Two independent
 * readers must agree on what it is, whatever its name or header said.
 */
export async function readPicture(bytes: Uint8Array): Promise<Picture | PictureRefusal> {
  if (bytes.byteLength > MAX_UPLOAD_BYTES)
    return { refused: "too-large", says: "The picture is larger than 8 MB. Make it smaller, or take it at a lower resolution." };
  const kind = await fileTypeFromBuffer(bytes);
  if (kind && ["image/heic", "image/heif"].includes(kind.mime)) {
    return {
      refused: "heic",
      says: "HEIC pictures cannot be read here. Send it as JPEG: on an iPhone, Settings, Camera, Formats, Most Compatible.",
    };
  }
  if (!kind || !MIME_TYPES.includes(kind.mime)) return notAPicture;
  try {
    const image = sharp(bytes, { limitInputPixels: MAX_PIXELS, failOn: "error" });
    const { format, width, height } = await image.metadata();
    if (!FORMATS.includes(format) || `image/${format}` !== kind.mime) return notAPicture;
    if (width * height > MAX_PIXELS) return tooManyPixels;
    const { data, info } = await image
      .autoOrient()
      .resize({ width: LONGEST_SIDE, height: LONGEST_SIDE, fit: "inside", withoutEnlargement: true })
      .flatten({ background: "#ffffff" })
      .jpeg({ quality: 82 })
      .toBuffer({ resolveWithObject: true });
    return { body: data, type: "image/jpeg", width: info.width, height: info.height };
  } catch (e) {
    if (e instanceof Error && /pixel limit/i.test(e.message)) return tooManyPixels;
    return { refused: "damaged", says: "The picture is damaged and cannot be read. Take it again." };
  }
}

const notAPicture: PictureRefusal = { refused: "not-a-picture", says: "This is not a JPEG, PNG or WebP picture, whatever it is called." };
const tooManyPixels: PictureRefusal = {
  refused: "too-many-pixels",
  says: "The picture has too many pixels to read safely. Make it smaller.",
};
