import sharp from "sharp";
import { afterEach, beforeAll, describe, expect, it } from "vitest";
import { GET as getPhotograph } from "@/app/api/cases/[caseId]/photograph/route";
import { GET as getCase } from "@/app/api/cases/[caseId]/route";
import { POST as addCase } from "@/app/api/cases/route";
import { CaseDetailSchema } from "@/lib/cases/schema";
import { deleteObject, getObject } from "@/lib/storage/objects";
import { listObjectKeys } from "../../support/bucket";
import { callRoute } from "../../support/call-route";
import { caseFields, caseForm } from "../../support/case-form";
import { changingNothing } from "../../support/changing-nothing";
import { useDatabase } from "../../support/database";
import { useFaultyStorage } from "../../support/faulty-storage";
import { itIsGuarded } from "../../support/guarded-route";
import {
  flatPhotograph,
  isoMediaFile,
  jpegMarkers,
  METADATA_WORDS,
  pngHeader,
  withMetadata,
  withSegment,
} from "../../support/photographs";
import { expectFieldErrors, expectProblem, expectUnforeseen } from "../../support/problem";
import { signInAs } from "../../support/session";
import { makeTwoDepartments, type TwoDepartments } from "../../support/staff";
import { leftExo, makeCase, makePhotograph } from "../../support/world";
import { near } from "../../unit/statistics/near";

describe("the photograph of a case", () => {
  const db = useDatabase();
  const storage = useFaultyStorage();
  afterEach(() => storage.heal());
  let people: TwoDepartments;
  beforeAll(async () => {
    people = await makeTwoDepartments(db());
  });

  let codes = 0;
  const upload = (file: Uint8Array, headers: Record<string, string> = {}) => {
    signInAs(people.own.lead.id);
    const body = caseForm(caseFields({ code: `U${++codes}` }), file);
    return callRoute(addCase, { method: "POST", body, headers });
  };
  const refuse = (file: Uint8Array, headers?: Record<string, string>) =>
    changingNothing(db(), () => upload(file, headers));

  /** The object that an upload stored, with the row that names it. */
  const storedOf = async (file: Uint8Array) => {
    const { status, body } = await upload(file);
    expect(status).toBe(201);
    const { id } = CaseDetailSchema.pick({ id: true }).parse(body);
    const row = await db()("photographs")
      .join("cases", "cases.photograph_id", "photographs.id")
      .where("cases.id", id)
      .first("photographs.*");
    return { row, body: (await getObject(row.storage_key)).body };
  };

  describe("uploaded", () => {
    it.each(["jpeg", "png", "webp"] as const)("keeps nothing of a %s file but its pixels", async (format) => {
      const file = await withMetadata(format);
      const before = await sharp(file).metadata();
      expect([before.exif, before.xmp, before.icc].map((part) => part !== undefined)).toEqual([true, true, true]);
      expect(METADATA_WORDS.filter((word) => file.includes(word) || before.exif?.includes(word))).not.toEqual([]);

      const { row, body } = await storedOf(file);
      const after = await sharp(body).metadata();
      expect(after).toMatchObject({ format: "jpeg", space: "srgb", channels: 3, width: 600, height: 200 });
      for (const part of ["exif", "xmp", "icc", "iptc", "comments", "orientation"] as const) {
        expect(after[part]).toBeUndefined();
      }
      expect(METADATA_WORDS.filter((word) => Buffer.from(body).includes(word))).toEqual([]);
      expect(row).toMatchObject({ width: 600, height: 200, size_bytes: body.byteLength });
      expect(row.storage_key).toMatch(/^photographs\/[0-9a-f-]{36}$/);
    });

    it("keeps no comment, no IPTC block and nothing behind the end of the file", async () => {
      const plain = await withMetadata("jpeg");
      const commented = withSegment(withSegment(plain, 0xfe, "Exampletown"), 0xed, "Photoshop 3.0\0A Photographer");
      expect(jpegMarkers(commented)).toEqual(expect.arrayContaining([0xfe, 0xed]));
      const { body } = await storedOf(Buffer.concat([commented, Buffer.from("A Camera behind the end")]));
      const [application0, tables, frame, huffman, scan] = [0xe0, 0xdb, 0xc0, 0xc4, 0xda];
      const allowed = [application0, tables, frame, huffman, scan, 0xc2, 0xdd];
      expect(jpegMarkers(body).filter((marker) => !allowed.includes(marker))).toEqual([]);
      expect(Buffer.from(body.subarray(-2)).toString("hex")).toBe("ffd9");
    });

    it("is turned upright as its orientation says, and its colours stay what they were", async () => {
      const upsideDown = await withMetadata("jpeg", 3);
      expect(await sharp(upsideDown).metadata()).toMatchObject({ orientation: 3 });
      const { row, body } = await storedOf(upsideDown);
      expect(row).toMatchObject({ width: 600, height: 200 });
      const { data } = await sharp(body).raw().toBuffer({ resolveWithObject: true });
      const pixelAt = (x: number) => [...data.subarray(3 * (100 * 600 + x), 3 * (100 * 600 + x) + 3)];
      const about = (...colour: number[]) => colour.map((value) => near(value, 0, 4));
      // What was red on the left is on the right; the file's Display P3 has become sRGB again.
      expect([pixelAt(100), pixelAt(500)]).toEqual([about(0x88, 0x99, 0xaa), about(0xd0, 0x20, 0x20)]);
    });

    it("measures the width of a photograph that lies on its side as it stands", async () => {
      const onItsSide = await flatPhotograph(200, 420).withMetadata({ orientation: 6 }).jpeg().toBuffer();
      expect((await storedOf(onItsSide)).row).toMatchObject({ width: 420, height: 200 });
      const tooNarrow = await flatPhotograph(420, 200).withMetadata({ orientation: 6 }).jpeg().toBuffer();
      expectFieldErrors(await refuse(tooNarrow), ["#/photograph"]);
    });

    it("has no transparent parts", async () => {
      const clear = await sharp({ create: { width: 400, height: 200, channels: 4, background: "#ff000000" } })
        .png()
        .toBuffer();
      const { body } = await storedOf(clear);
      expect((await sharp(body).stats()).channels.map(({ mean }) => Math.round(mean))).toEqual([0x77, 0x77, 0x77]);
    });
  });

  describe("refused", () => {
    it.each<[string, () => Promise<Uint8Array> | Uint8Array]>([
      ["a text", () => Buffer.from("not an image, whatever its name says")],
      ["a PDF file", () => Buffer.from("%PDF-1.7\n1 0 obj\n")],
      ["an SVG drawing", () => Buffer.from('<svg xmlns="http://www.w3.org/2000/svg" width="500" height="300"/>')],
      ["a GIF file", () => flatPhotograph(420, 184).gif().toBuffer()],
      ["a TIFF file", () => flatPhotograph(420, 184).tiff().toBuffer()],
    ])("answers 415 to %s", async (_, makeFile) => {
      const { errors } = expectProblem(await refuse(await makeFile()), 415, "not-a-photograph");
      expect(errors).toMatchObject([{ pointer: "#/photograph" }]);
    });
    it.each(["heic", "heix", "mif1", "msf1"])("names HEIC in its answer to such a file (%s)", async (brand) => {
      expect(expectProblem(await refuse(isoMediaFile(brand)), 415, "not-a-photograph").detail).toContain("HEIC");
    });

    it.each(["jpeg", "png", "webp"] as const)("answers 422 to a %s file that is cut short", async (format) => {
      const whole = await withMetadata(format);
      for (const length of [12, Math.floor(0.5 * whole.length), Math.floor(0.9 * whole.length)]) {
        expectFieldErrors(await refuse(whole.subarray(0, length)), ["#/photograph"]);
      }
    });

    it("answers 413 to one byte over 20 MB, and takes 20 MB", { timeout: 120_000 }, async () => {
      const photograph = await makePhotograph();
      const padded = (size: number) => Buffer.concat([photograph, Buffer.alloc(size - photograph.length)]);
      expectProblem(await refuse(padded(20_000_001)), 413, "photograph-too-large");
      expect((await upload(padded(20_000_000))).status).toBe(201);
    });
    it("answers 413 to a form far over 20 MB without reading it", async () => {
      const called = await refuse(await makePhotograph(), { "content-length": "20200001" });
      expectProblem(called, 413, "photograph-too-large");
    });
    it("answers 413 to a row over 50 megapixels, and takes 50 megapixels", { timeout: 180_000 }, async () => {
      expectProblem(await refuse(await flatPhotograph(8000, 6251).png().toBuffer()), 413, "photograph-too-large");
      expect((await upload(await flatPhotograph(8000, 6250).png().toBuffer())).status).toBe(201);
    });
    it("answers 413 to a picture of any size by its header, before a pixel of it is decoded", async () => {
      const file = pngHeader(200_000, 200_000); // 120 gigabytes of pixels
      expectProblem(await refuse(file), 413, "photograph-too-large");
    });
    it("answers 422 to one too small to be read, and takes the smallest", async () => {
      for (const [width, height] of [
        [399, 300],
        [400, 99],
        [400, 6], // trimmed for a showing, nothing of it would be left
      ] as const) {
        expectFieldErrors(await refuse(await flatPhotograph(width, height).png().toBuffer()), ["#/photograph"]);
      }
      expect((await upload(await flatPhotograph(400, 100).png().toBuffer())).status).toBe(201);
    });

    it.each(["refused", "answer lost"] as const)("answers 503 when the storage fails (%s)", async (fault) => {
      const file = await makePhotograph();
      const called = await changingNothing(db(), async () => {
        storage.failPutAfter(0, fault);
        const answer = await upload(file);
        storage.heal();
        return answer;
      });
      expectProblem(called, 503, "storage-unavailable");
    });
    it("removes the photograph again when the case cannot be stored", async () => {
      await makeCase(db(), people.own.lead, leftExo(10), { code: "taken" });
      const objects = await listObjectKeys();
      signInAs(people.own.lead.id);
      const body = caseForm(caseFields({ code: "taken" }), await makePhotograph());
      expectProblem(await callRoute(addCase, { method: "POST", body }), 409, "code-in-use");
      expect(await listObjectKeys()).toEqual(objects);
    });
  });

  describe("GET /api/cases/[caseId]/photograph", () => {
    let caseId: string;
    let key: string;
    beforeAll(async () => {
      signInAs(people.own.lead.id);
      const body = caseForm(caseFields({ code: "shown" }), await flatPhotograph(1200, 500).jpeg().toBuffer());
      const called = await callRoute(addCase, { method: "POST", body });
      caseId = CaseDetailSchema.pick({ id: true }).parse(called.body).id;
      const row = await db()("cases").join("photographs", "photographs.id", "photograph_id").where("cases.id", caseId);
      key = row[0].storage_key;
    });
    const get = (query: Record<string, string> = {}) => {
      signInAs(people.own.lead.id);
      return callRoute(getPhotograph, { params: { caseId }, query });
    };
    itIsGuarded({
      db,
      handler: getPhotograph,
      roles: ["lead"],
      people: () => people,
      call: () => ({ params: { caseId } }),
      param: "caseId",
    });

    it("gives the stored photograph, for this person's browser alone", async () => {
      const { status, body, headers } = await get();
      expect(status).toBe(200);
      expect(body).toEqual((await getObject(key)).body);
      expect(Object.fromEntries(headers)).toEqual({
        "cache-control": "private, max-age=1800",
        "content-disposition": "inline",
        "content-length": String((await getObject(key)).body.byteLength),
        "content-type": "image/jpeg",
      });
    });
    it("gives a thumbnail of 640 pixels when asked", async () => {
      const { body } = await get({ size: "small" });
      if (!(body instanceof Uint8Array)) throw new Error("no picture");
      const metadata = await sharp(body).metadata();
      expect(metadata).toMatchObject({ format: "jpeg", width: 640, height: 267 });
    });
    it("still shows a retired case", async () => {
      await db()("cases").where({ id: caseId }).update({ retired_at: new Date() });
      expect((await get()).status).toBe(200);
    });
    it("tells no key when the object is missing", async () => {
      await deleteObject(key);
      expectUnforeseen(await get());
      expect((await callRoute(getCase, { params: { caseId } })).status).toBe(200);
    });
  });
});
