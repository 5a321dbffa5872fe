import sharp from "sharp";

/** A photo as a phone would send it: real JPEG, with a place and a serial number in its metadata. */
export async function phonePhoto(): Promise<{ name: string; mimeType: string; buffer: Buffer }> {
  const buffer = await sharp({ create: { width: 1200, height: 900, channels: 3, background: "#8a8577" } })
    .jpeg({ quality: 80 })
    .withExif({
      IFD0: { Make: "Test", Software: "secret-serial-4711" },
      IFD3: { GPSLatitude: "46/1 54/1 0/1" },
    })
    .toBuffer();
  return { name: "bolt.jpg", mimeType: "image/jpeg", buffer };
}
