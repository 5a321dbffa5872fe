import "server-only";
import { createHash, randomBytes } from "node:crypto";
import { fileTypeFromBuffer } from "file-type";
import sharp from "sharp";
import { MAX_PHOTO_BYTES } from "@/lib/domain/report/photo-limits";
import { AppError } from "@/lib/shared/errors";

/** Largest picture taken, pixels: a small file can unfold into a huge picture. */
const MAX_PIXELS = 50_000_000;
const LARGE_PX = 2048;
const THUMB_PX = 480;
const TAKEN: Readonly<Record<string, string>> = {
  "image/jpeg": "jpg",
  "image/png": "png",
  "image/webp": "webp",
};

// One picture at a time: several at once would take the memory of the whole machine.
sharp.concurrency(1);
sharp.cache(false);

export interface PreparedPhoto {
  sha256: string;
  widthPx: number;
  heightPx: number;
  files: { original: StoredFile; large: StoredFile; thumb: StoredFile };
}

interface StoredFile {
  key: string;
  bytes: Uint8Array;
  contentType: string;
}

/**
 * Checks what a file really is, then makes the two public copies: turned upright, without any metadata, as
 * WebP. The original is kept as it came and shown to nobody. @throws AppError in words a person can act on.
 */
export async function preparePhoto(bytes: Uint8Array): Promise<PreparedPhoto> {
  if (bytes.byteLength === 0) throw refused("The file is empty.");
  if (bytes.byteLength > MAX_PHOTO_BYTES) {
    throw new AppError("too_large", "The photo is larger than 20 MB. Send a smaller one.");
  }
  const type = await fileTypeFromBuffer(bytes);
  const extension = type && TAKEN[type.mime];
  if (!type || !extension) {
    throw refused(
      type?.mime.startsWith("image/")
        ? `Photos of the kind ${type.ext.toUpperCase()} are not taken yet. Send JPEG, PNG or WebP.`
        : "This is not a photo. Send JPEG, PNG or WebP.",
    );
  }
  const large = await copy(bytes, LARGE_PX, 80);
  const thumb = await copy(bytes, THUMB_PX, 72);
  const name = randomBytes(24).toString("hex");
  const thumbName = randomBytes(24).toString("hex");
  return {
    sha256: createHash("sha256").update(bytes).digest("hex"),
    widthPx: large.info.width,
    heightPx: large.info.height,
    files: {
      original: { key: keyOf(`${name}-original`, extension), bytes, contentType: type.mime },
      large: { key: keyOf(name, "webp"), bytes: large.data, contentType: "image/webp" },
      thumb: { key: keyOf(thumbName, "webp"), bytes: thumb.data, contentType: "image/webp" },
    },
  };
}

async function copy(bytes: Uint8Array, longestPx: number, quality: number) {
  try {
    return await sharp(bytes, { limitInputPixels: MAX_PIXELS, failOn: "error" })
      .autoOrient()
      .resize({ width: longestPx, height: longestPx, fit: "inside", withoutEnlargement: true })
      .toColourspace("srgb")
      .webp({ quality })
      .toBuffer({ resolveWithObject: true });
  } catch (error) {
    if (error instanceof Error && /pixel limit/i.test(error.message)) {
      throw new AppError("too_large", "The picture has more than 50 megapixels. Send a smaller one.", {
        cause: error,
      });
    }
    throw refused("The photo is damaged or was cut off on the way. Send it again.", error);
  }
}

function keyOf(name: string, extension: string): string {
  return `${name.slice(0, 2)}/${name}.${extension}`;
}

function refused(message: string, cause?: unknown): AppError {
  return new AppError("invalid_input", message, { problems: [{ path: "file", message }], cause });
}
