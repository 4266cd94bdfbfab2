export type VitestReport = { testResults: { status: string; assertionResults: { status: string }[] }[] };

export function countTests(
  report: VitestReport | null,
  runSucceeded: boolean,
): { passed: number; failed: number; skipped: number };
