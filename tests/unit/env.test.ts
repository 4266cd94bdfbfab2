import { readFileSync } from "node:fs";
import { afterEach, beforeEach, describe, expect, it, vi } from "vitest";
import { z } from "zod";
import { readSettings } from "@/lib/env";

describe("readSettings", () => {
  const Schema = z.object({
    ADDRESS: z.url("must be an address"),
    COUNT: z.coerce.number("must be a number").default(10),
    NOTE: z.string().optional(),
  });
  it("reads what is set and fills in the rest", () => {
    expect(readSettings(Schema, { ADDRESS: "http://a.example", OTHER: "x" })).toEqual({
      ADDRESS: "http://a.example",
      COUNT: 10,
    });
  });
  it("takes an empty value, as in a copied example file, for one that is not set", () => {
    expect(readSettings(Schema, { ADDRESS: "http://a.example", COUNT: " ", NOTE: "" })).toEqual({
      ADDRESS: "http://a.example",
      COUNT: 10,
    });
  });
  it("names every setting that is missing or wrong, with what it must be", () => {
    expect(() => readSettings(Schema, { COUNT: "many" })).toThrow(
      [
        "Some settings need to be changed (they are explained in .env.example):",
        "  ADDRESS is not set: it must be an address",
        "  COUNT must be a number",
      ].join("\n"),
    );
  });
});

describe("the settings", () => {
  beforeEach(() => void vi.resetModules()); // each is read once
  afterEach(() => void vi.unstubAllEnvs());
  const read = async (name: "env" | "storageEnv" | "launchEnv", variables: Record<string, string>) => {
    for (const [key, value] of Object.entries(variables)) vi.stubEnv(key, value);
    const settings = await import("@/lib/env");
    return settings[name]();
  };
  const sound = {
    DATABASE_URL: "postgres://a:b@127.0.0.1:5432/c",
    NEXTAUTH_SECRET: "x".repeat(32),
    NEXTAUTH_URL: "http://localhost:3000",
  };
  it("are accepted when sound", async () => {
    expect(await read("env", sound)).toEqual({ ...sound, DATABASE_POOL_MAX: 10 });
  });
  it.each([
    ["DATABASE_URL", "mysql://a:b@127.0.0.1/c", "DATABASE_URL must be the address of a PostgreSQL database"],
    ["DATABASE_POOL_MAX", "0", "DATABASE_POOL_MAX must be a whole number from 1 to 500"],
    ["NEXTAUTH_SECRET", "short", "NEXTAUTH_SECRET must be a random text of at least 32 characters"],
    ["NEXTAUTH_URL", "localhost:3000", "NEXTAUTH_URL must be the address under which people open the application"],
  ])("refuse %s=%s", async (name, value, message) => {
    await expect(read("env", { ...sound, [name]: value })).rejects.toThrow(message);
  });
  it("ask for both keys of the bucket or neither", async () => {
    await expect(read("storageEnv", { S3_BUCKET: "photographs", S3_ACCESS_KEY_ID: "a" })).rejects.toThrow(
      "S3_SECRET_ACCESS_KEY is not set: it must be set together with S3_ACCESS_KEY_ID, or both left out",
    );
  });
  it("say that a port is no port", async () => {
    await expect(read("launchEnv", { PORT: "70000" })).rejects.toThrow("PORT must be a whole number from 1 to 65535");
  });
  it("are all explained in .env.example, and nothing else is", () => {
    const source = readFileSync("lib/env.ts", "utf8");
    const read = new Set(source.match(/^ +([A-Z][A-Z0-9_]+)(?=:)/gm)?.map((name) => name.trim()));
    const explained = new Set(
      readFileSync(".env.example", "utf8")
        .match(/^#([A-Z][A-Z0-9_]+)(?==)/gm)
        ?.map((name) => name.slice(1)),
    );
    expect(explained).toEqual(read);
  });
});
