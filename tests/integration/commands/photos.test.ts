import { mkdtempSync, readdirSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import sharp from "sharp";
import { eq } from "drizzle-orm";
import { v7 } from "uuid";
import { describe, expect, it, vi } from "vitest";
import { photos } from "@/db/schema";
import { addPhoto } from "@/lib/commands/add-photo";
import { readPhoto } from "@/lib/commands/read-photo";
import { accountDatabase } from "@/tests/support/account-database";
import { addArea, addCast, contextOf } from "@/tests/support/people";
import { addRegister } from "@/tests/support/register";

const folder = mkdtempSync(path.join(tmpdir(), "byssus-photos-"));
vi.stubEnv("BYSSUS_DATA_DIR", folder);
const db = accountDatabase("command_photos");

async function scene(visibility: "public" | "sensitive" | "members" = "public") {
  const areaId = await addArea(db());
  const cast = await addCast(db(), areaId);
  return { cast, r: await addRegister(db(), { areaId, ...cast }, visibility) };
}

type Scene = Awaited<ReturnType<typeof scene>>;

function add({ cast, r }: Scene, bytes: Uint8Array, id = v7()) {
  return addPhoto(contextOf(db(), cast.rigger), { id, caption: "", bytes, to: { reportId: r.reportId } });
}

const picture = (width: number, height: number) =>
  sharp({ create: { width, height, channels: 3, background: "#7a8b99" } });

const filesKept = () =>
  readdirSync(folder, { recursive: true, withFileTypes: true }).filter((entry) => entry.isFile()).length;

describe("a photo", () => {
  it("is stored upright, in two sizes, without its place", async () => {
    const s = await scene();
    // Orientation 6: the camera was held upright, so the picture has to be turned by a quarter.
    const bytes = await picture(3000, 1500)
      .withExif({ IFD0: { Orientation: "6" }, IFD3: { GPSLatitude: "52/1 6/1 0/1", GPSLatitudeRef: "N" } })
      .jpeg()
      .toBuffer();
    expect((await sharp(bytes).metadata()).exif).toBeDefined();
    const turned = await sharp(bytes).withMetadata({ orientation: 6 }).jpeg().toBuffer();
    const added = await add(s, turned);
    expect(added).toMatchObject({ widthPx: 1024, heightPx: 2048, replayed: false });
    const large = await readPhoto(contextOf(db(), s.cast.visitor), keyOf(added.largeUrl));
    const shown = await sharp(large).metadata();
    expect(shown).toMatchObject({ format: "webp", width: 1024, height: 2048 });
    expect([shown.exif, shown.xmp, shown.iptc]).toEqual([undefined, undefined, undefined]);
    const thumb = await sharp(await readPhoto(contextOf(db()), keyOf(added.thumbUrl))).metadata();
    expect(thumb).toMatchObject({ width: 240, height: 480 });
  });

  it("sent twice is one photo; another picture under its id is a conflict", async () => {
    const s = await scene();
    const id = v7();
    const bytes = await picture(100, 80).png().toBuffer();
    const answers = [await add(s, bytes, id), await add(s, bytes, id)];
    expect(answers.map((answer) => answer.replayed)).toEqual([false, true]);
    await expect(add(s, await picture(90, 80).webp().toBuffer(), id)).rejects.toMatchObject({
      code: "conflict",
    });
    expect(await db().$count(photos, eq(photos.id, id))).toBe(1);
  });
});

describe("a file that is no usable photo", () => {
  const svg = new TextEncoder().encode(
    '<svg xmlns="http://www.w3.org/2000/svg"><rect width="9" height="9"/></svg>',
  );

  it.each([
    [
      "text",
      async () => new TextEncoder().encode("hello, this is not a picture at all"),
      "invalid_input",
      /not a photo/,
    ],
    ["SVG", async () => svg, "invalid_input", /not a photo/],
    ["nothing", async () => new Uint8Array(), "invalid_input", /empty/],
    ["GIF", () => picture(9, 9).gif().toBuffer(), "invalid_input", /GIF/],
    [
      "a picture that was cut off",
      async () => {
        const whole = await picture(1200, 900).jpeg().toBuffer();
        return whole.subarray(0, Math.floor(whole.length / 2));
      },
      "invalid_input",
      /damaged|cut off/,
    ],
    ["more than 50 megapixels", () => picture(10_000, 5_001).png().toBuffer(), "too_large", /megapixels/],
    ["more than 20 MB", async () => new Uint8Array(20 * 1024 * 1024 + 1), "too_large", /20 MB/],
  ])("is refused in clear words and leaves nothing behind: %s", async (_what, bytes, code, words) => {
    const s = await scene();
    const before = filesKept();
    const refused = add(s, await bytes());
    await expect(refused).rejects.toMatchObject({ code, message: expect.stringMatching(words) });
    expect(await db().$count(photos, eq(photos.reportId, s.r.reportId))).toBe(0);
    expect(filesKept()).toBe(before);
  });
});

describe("the public copy of a photo", () => {
  it.each(["sensitive", "members"] as const)("at a %s site is absent for outsiders", async (visibility) => {
    const s = await scene(visibility);
    const added = await add(s, await picture(60, 40).jpeg().toBuffer());
    for (const key of [keyOf(added.largeUrl), keyOf(added.thumbUrl)]) {
      await expect(readPhoto(contextOf(db(), s.cast.rigger), key)).resolves.toBeInstanceOf(Uint8Array);
      await expect(readPhoto(contextOf(db(), s.cast.outsider), key)).rejects.toMatchObject({
        code: "not_found",
      });
      await expect(readPhoto(contextOf(db()), key)).rejects.toMatchObject({ code: "not_found" });
    }
  });

  it("is all there is to see: the original is shown to nobody, and a path is no key", async () => {
    const s = await scene();
    const { id } = await add(s, await picture(60, 40).jpeg().toBuffer());
    const [row] = await db().select().from(photos).where(eq(photos.id, id));
    for (const key of [row?.originalKey ?? "", "../../etc/passwd", "ab/../../x.webp", ""]) {
      await expect(readPhoto(contextOf(db(), s.cast.admin), key)).rejects.toMatchObject({
        code: "not_found",
      });
    }
  });
});

function keyOf(url: string): string {
  return url.replace("/api/uploads/", "");
}
