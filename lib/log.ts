/** One line of JSON for each error, with the request id that the person was shown. Never a body, a finding or a name. */
export function logError(error: unknown, context: Record<string, string>): void {
  const { name, message, stack } = error instanceof Error ? error : new Error(String(error));
  console.error(JSON.stringify({ level: "error", at: new Date().toISOString(), ...context, name, message, stack }));
}
