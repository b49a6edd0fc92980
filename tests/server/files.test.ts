import { existsSync } from "node:fs";
import { mkdtemp, readdir } from "node:fs/promises";
import os from "node:os";
import path from "node:path";
import sharp from "sharp";
import { afterAll, beforeAll, describe, expect, test } from "vitest";
import { startFakeS3 } from "../../scripts/lib/fake-s3.mjs";
import { prove, withScope } from "@/lib/server/auth/scope";
import { keepFile } from "@/lib/server/files/commands";
import { folderStore } from "@/lib/server/files/folder-store";
import type { ObjectStore } from "@/lib/server/files/object-store";
import { MAX_UPLOAD_BYTES, readPicture } from "@/lib/server/files/picture";
import { readFile } from "@/lib/server/files/queries";
import { s3Store } from "@/lib/server/files/s3-store";
import { afloat, type Afloat } from "../support/afloat";
import { testDatabase } from "../support/database";

const plain = (width = 40, height = 30) => sharp({ create: { width, height, channels: 3, background: "#0a7" } });
const bytesOf = (body: ReadableStream<Uint8Array>) => new Response(body).bytes();

describe.each(["folder", "s3"] as const)("the object store: %s", (kind) => {
  let store: ObjectStore;
  let s3: Awaited<ReturnType<typeof startFakeS3>>;
  beforeAll(async () => {
    s3 = await startFakeS3();
    s3.buckets.set("photos", new Map());
    process.env.AWS_ACCESS_KEY_ID = "test";
    process.env.AWS_SECRET_ACCESS_KEY = "test";
    store =
      kind === "folder"
        ? folderStore(await mkdtemp(path.join(os.tmpdir(), "gudgeon-files-")))
        : s3Store({ bucket: "photos", endpoint: s3.url });
  });
  afterAll(() => s3.stop());

  test("gives back what was put in, the newest, and nothing after it is deleted", async () => {
    await store.put("fleet/a.jpg", Buffer.from("first"), "image/jpeg");
    await store.put("fleet/a.jpg", Buffer.from("second"), "image/jpeg");
    const found = await store.get("fleet/a.jpg");
    expect(found?.size).toBe(6);
    expect(Buffer.from(await bytesOf(found?.body as ReadableStream<Uint8Array>)).toString()).toBe("second");
    await store.delete("fleet/a.jpg");
    expect(await store.get("fleet/a.jpg")).toBeNull();
    expect(await store.get("fleet/never.jpg")).toBeNull();
  });

  test.each(["../secrets.json", "/etc/passwd", "a/../../b", "a//b", ".hidden", "a\0b", ""])("refuses the key %j", async (key) => {
    await expect(store.put(key, Buffer.from("x"), "image/jpeg")).rejects.toThrow(/Bad key/);
    await expect(store.get(key)).rejects.toThrow(/Bad key/);
  });
});

test("a file is whole or not there: nothing unfinished is left beside it", async () => {
  const root = await mkdtemp(path.join(os.tmpdir(), "gudgeon-files-"));
  await Promise.all(Array.from({ length: 8 }, (_, i) => folderStore(root).put("fleet/a.jpg", Buffer.alloc(50_000, i), "image/jpeg")));
  expect(await readdir(path.join(root, "fleet"))).toEqual(["a.jpg"]);
});

describe("an uploaded picture", () => {
  test.each(["jpeg", "png", "webp"] as const)("is taken as %s and comes out as JPEG", async (format) => {
    const picture = await readPicture(await plain()[format]().toBuffer());
    expect(picture).toMatchObject({ type: "image/jpeg", width: 40, height: 30 });
    expect("body" in picture && (await sharp(picture.body).metadata()).format).toBe("jpeg");
  });

  test("loses place, camera and owner, and keeps the way up", async () => {
    const sent = await plain()
      .jpeg()
      .withMetadata({
        orientation: 6,
        exif: { IFD0: { Copyright: "Somebody" }, IFD3: { GPSLatitude: "54/1 30/1 0/1", GPSLatitudeRef: "N" } },
      } as object)
      .toBuffer();
    expect((await sharp(sent).metadata()).exif).toBeDefined();
    const picture = await readPicture(sent);
    if (!("body" in picture)) throw new Error(picture.says);
    const { exif, orientation, icc, xmp } = await sharp(picture.body).metadata();
    expect([exif, orientation, icc, xmp]).toEqual([undefined, undefined, undefined, undefined]);
    expect([picture.width, picture.height]).toEqual([30, 40]);
  });

  test("is made smaller where a screen needs no more", async () => {
    expect(await readPicture(await plain(4000, 1000).png().toBuffer())).toMatchObject({ width: 2400, height: 600 });
  });

  test("is refused over 8 MB, before anything reads it", async () => {
    expect(await readPicture(Buffer.alloc(MAX_UPLOAD_BYTES + 1))).toMatchObject({ refused: "too-large" });
  });

  test.each([
    ["a program", Buffer.from("MZ\x90\0\x03\0\0\0\x04\0\0\0\xff\xff", "latin1")],
    ["a web page", Buffer.from("<html><script>alert(1)</script></html>")],
    [
      "a drawing with a script in it",
      Buffer.from('<?xml version="1.0"?><svg xmlns="http://www.w3.org/2000/svg"><script>alert(1)</script></svg>'),
    ],
    ["a moving picture", Buffer.from("GIF89a\x01\0\x01\0\x80\0\0\0\0\0\xff\xff\xff,\0\0\0\0\x01\0\x01\0\0\x02\x02D\x01\0;", "latin1")],
    ["nothing", Buffer.alloc(0)],
  ])("is refused when it is %s, whatever it is called", async (_what, bytes) => {
    expect(await readPicture(bytes)).toMatchObject({ refused: "not-a-picture" });
  });

  test("is refused in words when it is HEIC", async () => {
    const heic = Buffer.concat([Buffer.from([0, 0, 0, 24]), Buffer.from("ftypheic\0\0\0\0mif1heic", "latin1"), Buffer.alloc(64)]);
    expect(await readPicture(heic)).toMatchObject({ refused: "heic", says: expect.stringMatching(/JPEG/) });
  });

  test("is refused when only its head is a picture's", async () => {
    const whole = await plain(400, 400).jpeg().toBuffer();
    expect(await readPicture(whole.subarray(0, 200))).toMatchObject({ refused: "damaged" });
  });

  test("is refused when a small file would unfold into too many pixels", async () => {
    const bomb = await sharp({ create: { width: 10_000, height: 7_000, channels: 3, background: "#000" }, limitInputPixels: false })
      .png({ compressionLevel: 9 })
      .toBuffer();
    expect(bomb.byteLength).toBeLessThan(MAX_UPLOAD_BYTES);
    expect(await readPicture(bomb)).toMatchObject({ refused: "too-many-pixels" });
  });

  test("loses what is hidden behind its end", async () => {
    const picture = await readPicture(Buffer.concat([await plain().jpeg().toBuffer(), Buffer.from("<script>alert(1)</script>")]));
    expect("body" in picture && picture.body.includes("<script>")).toBe(false);
  });
});

describe("a photo of a fleet", () => {
  let ines: Afloat;
  let mats: Afloat;
  beforeAll(async () => {
    await testDatabase();
    process.env.FILES_DIR = await mkdtemp(path.join(os.tmpdir(), "gudgeon-files-"));
    [ines, mats] = [await afloat("Ines"), await afloat("Mats")];
  });
  const keep = async (who: Afloat, id: string, bytes: Buffer) => keepFile(await prove(who.person, who.fleetId, "file:write"), id, bytes);
  const read = (who: Afloat, id: string) => withScope(who.person, who.fleetId, "file:read", (scope) => readFile(scope, id));

  test("is read back under headers that let no browser run it", async () => {
    const id = crypto.randomUUID();
    const kept = await keep(ines, id, await plain().png().toBuffer());
    expect(kept).toMatchObject({ id, mediaType: "image/jpeg", widthPx: 40, heightPx: 30 });
    const answer = await read(ines, id);
    expect(Object.fromEntries(answer.headers)).toMatchObject({
      "content-type": "image/jpeg",
      "x-content-type-options": "nosniff",
      "content-length": String(kept.bytes),
    });
    expect(answer.headers.get("content-security-policy")).toContain("sandbox");
    expect(answer.headers.get("vary")).toBe("cookie");
    expect((await sharp(await answer.bytes()).metadata()).format).toBe("jpeg");
  });

  test("is encoded and put away while no transaction waits for it", async () => {
    const lena = await afloat("Lena");
    const pass = await prove(lena.person, lena.fleetId, "file:write");
    const isPutAway = () => existsSync(path.join(process.env.FILES_DIR!, lena.fleetId));
    const transactions: { before: boolean; after: boolean }[] = [];
    const watched: typeof pass = {
      enter: async (run) => {
        const before = isPutAway();
        const result = await pass.enter(run);
        transactions.push({ before, after: isPutAway() });
        return result;
      },
    };
    await keepFile(watched, crypto.randomUUID(), await plain().png().toBuffer());
    expect(transactions.filter(({ before, after }) => before !== after)).toEqual([]);
    expect(transactions.at(0)).toEqual({ before: false, after: false });
    expect(transactions.at(-1)).toEqual({ before: true, after: true });
  });

  test("sent twice is one photo; another under its id is refused and the first stays", async () => {
    const id = crypto.randomUUID();
    const first = await keep(ines, id, await plain().png().toBuffer());
    expect(await keep(ines, id, await plain().png().toBuffer())).toEqual(first);
    await expect(keep(ines, id, await plain(9, 9).png().toBuffer())).rejects.toMatchObject({ status: 409 });
    expect((await sharp(await (await read(ines, id)).bytes()).metadata()).width).toBe(40);
  });

  test("is not there for another fleet, which may use the same id for its own", async () => {
    const id = crypto.randomUUID();
    await keep(ines, id, await plain().png().toBuffer());
    await expect(read(mats, id)).rejects.toMatchObject({ status: 404 });
    await keep(mats, id, await plain(9, 9).png().toBuffer());
    expect((await sharp(await (await read(ines, id)).bytes()).metadata()).width).toBe(40);
  });
});
