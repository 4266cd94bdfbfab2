import { expect } from "vitest";
import type { Answer } from "./leaks";

/** A person with a browser's cookies and nothing else: signs in as a browser does, and keeps every answer. */
export class Visitor {
  readonly answers: Answer[] = [];
  private readonly cookies = new Map<string, string>();

  constructor(private readonly address: string) {}

  async signIn(email: string, password: string): Promise<void> {
    const { body } = await this.get("/api/auth/csrf");
    const { csrfToken } = JSON.parse(Buffer.from(body).toString());
    const form = new URLSearchParams({ csrfToken, email, password, json: "true" });
    const answer = await this.ask("/api/auth/callback/credentials", { method: "POST", body: form });
    expect(answer.status).toBe(200);
    this.answers.length = 0;
  }

  get(path: string, headers: Record<string, string> = {}): Promise<Answer> {
    return this.ask(path, { headers });
  }

  async ask(path: string, init: RequestInit = {}): Promise<Answer> {
    const cookie = [...this.cookies].map(([name, value]) => `${name}=${value}`).join("; ");
    const url = new URL(path, this.address);
    const response = await fetch(url, { ...init, redirect: "manual", headers: { ...init.headers, cookie } });
    for (const line of response.headers.getSetCookie()) {
      const [, name = "", value = ""] = /^([^=]+)=([^;]*)/.exec(line) ?? [];
      this.cookies.set(name, value);
    }
    const body = new Uint8Array(await response.arrayBuffer());
    const answer = { url: url.pathname + url.search, status: response.status, headers: response.headers, body };
    this.answers.push(answer);
    return answer;
  }
}
