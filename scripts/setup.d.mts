export const ROOT: string;
export class SetupError extends Error {}
export type DebianPackage = "postgresql-15" | "chromium";

/** Throws SetupError where this Node.js is not one that the program is made for. */
export function checkNode(version?: string): void;
/** Reads .env into the environment, where there is one. */
export function loadEnvFile(): void;
export function missingDebianPackages(wanted: DebianPackage[], isThere?: (file: string) => boolean): DebianPackage[];
export function manualInstallMessage(missing: DebianPackage[], reason: string): string;
export function succeeds(command: string[], output?: "inherit" | "ignore"): Promise<boolean>;
export function ensureDebianPackages(wanted: DebianPackage[]): Promise<void>;
export function nodePackagesAreCurrent(root?: string): boolean;
export function ensureNodePackages(): Promise<void>;
