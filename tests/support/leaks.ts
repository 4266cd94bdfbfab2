import sharp from "sharp";

/** An answer of the server as a browser gets it. */
export type Answer = { url: string; status: number; headers: Headers; body: Uint8Array };

/** Something an examiner's browser must not get: its name for the report, and how to recognise it in text. */
export type Secret = { what: string; pattern: RegExp };

/** A secret that is a word of its own: a code, a key, a name. */
export function secretWord(what: string, word: string): Secret {
  return { what, pattern: new RegExp(word.replaceAll(/[.*+?^${}()|[\]\\]/g, "\\$&"), "i") };
}

/** Degrees that occur nowhere but in one finding, wherever a number of degrees may be written. */
export function secretDegrees(what: string, degrees: number): Secret {
  const forms = [
    `Degrees"?\\s*:\\s*"?${degrees}\\b`,
    `(tropia|\\b[LR](ET|XT|HT|HoT|CS|DS))\\s*${degrees}\\b`,
    `\\b${degrees}\\s*°`,
  ];
  return { what, pattern: new RegExp(forms.join("|"), "i") };
}

/** Every secret found in the answers, as "what: where". Text is searched as it is and with its escapes undone. */
export async function findLeaks(answers: readonly Answer[], secrets: readonly Secret[]): Promise<string[]> {
  const found: string[] = [];
  for (const answer of answers) {
    const headers = [...answer.headers].map(([name, value]) => `${name}: ${value}`).join("\n");
    const texts = new Map([
      ["address", unescapeText(answer.url)],
      ["headers", unescapeText(headers)],
      ["body", bodyText(answer)],
    ]);
    for (const { what, pattern } of secrets) {
      for (const [where, text] of texts) if (pattern.test(text)) found.push(`${what}: ${where} of ${answer.url}`);
    }
    found.push(...(await pictureLeaks(answer)));
  }
  return found;
}

function bodyText({ body }: Answer): string {
  const text = Buffer.from(body).toString("latin1");
  return `${unescapeText(Buffer.from(body).toString("utf8"))}\n${text}`;
}

/** Undoes what JSON in HTML, addresses and base64 do to a text, so that a secret cannot hide behind them. */
function unescapeText(text: string): string {
  const plain = text.replaceAll('\\"', '"').replaceAll("&quot;", '"').replaceAll("\\u0026", "&");
  const decoded = [...text.matchAll(/[A-Za-z0-9+/_-]{24,}={0,2}/g)].map(([run]) =>
    Buffer.from(run, "base64").toString("latin1"),
  );
  return [plain, decodeSafely(plain), ...decoded].join("\n");
}

function decodeSafely(text: string): string {
  return text.replaceAll(/(%[0-9a-f]{2})+/gi, (run) => {
    try {
      return decodeURIComponent(run);
    } catch {
      return run;
    }
  });
}

/** What travels with a picture besides pixels: metadata in the file, and validators that two showings would share. */
async function pictureLeaks({ url, headers, body }: Answer): Promise<string[]> {
  if (!headers.get("content-type")?.startsWith("image/jpeg")) return [];
  const metadata = await sharp(body).metadata();
  const inFile = (["exif", "icc", "iptc", "xmp", "comments"] as const).filter((part) => metadata[part] !== undefined);
  const inHeaders = ["etag", "last-modified", "x-amz-meta", "x-amz-id-2"].filter((name) => headers.has(name));
  return [...inFile, ...inHeaders].map((part) => `${part} with a picture: ${url}`);
}
