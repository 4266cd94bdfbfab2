import { vi } from "vitest";

/**
 * Stands in for what Next and next-auth know of a request: whose session it is, and its cookies. Everything of ours
 * behind them, the reading of roles from the database included, is real. A setup file of the integration tests.
 */
const request = {
  session: null as { personId: string; sessionVersion: number } | null,
  cookies: new Map<string, string>(),
};

export function signInAs(personId: string | null, { sessionVersion = 1, view = "" } = {}): void {
  request.session = personId === null ? null : { personId, sessionVersion };
  request.cookies = new Map(view ? [["evenglint-view", view]] : []);
}

export function cookieValue(name: string): string | undefined {
  return request.cookies.get(name);
}

vi.mock("next-auth", () => ({ getServerSession: async () => request.session }));
vi.mock("next/headers", () => ({
  cookies: async () => ({
    get: (name: string) => (request.cookies.has(name) ? { name, value: request.cookies.get(name) } : undefined),
    set: (name: string, value: string) => request.cookies.set(name, value),
  }),
}));
