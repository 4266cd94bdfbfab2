export type Lock = { release(): Promise<void> };
export type Holder = { pid: number; [fact: string]: unknown };

/** Takes the lock, or answers null where another process has it. `status` is asked anew for everyone who connects. */
export function takeLock(name: string, folder: string, status?: () => Record<string, unknown>): Promise<Lock | null>;
export function waitForLock(name: string, folder: string, onWait?: () => void): Promise<Lock>;
/** What the holder says about itself, or null where nobody holds the lock. */
export function askHolder(name: string, folder: string): Promise<Holder | null>;
