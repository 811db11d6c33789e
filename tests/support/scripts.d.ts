declare module '*/scripts/dev/one-origin.mjs' {
  import type { Server } from 'node:http';
  export function serveOneOrigin(plan: { port: number; routes: { prefix: string; port: number }[] }): Promise<Server>;
}

declare module '*/scripts/lib/packages.mjs' {
  export function installedEqualsLocked(folder?: string): boolean;
}

declare module '*/scripts/lib/lock.mjs' {
  export function takeLock(dir: string): { note: (pids: number[]) => void; release: () => void };
  export function isTaken(dir: string): boolean;
}

declare module '*/scripts/lib/services.mjs' {
  export interface Service {
    pid: number;
    exited: Promise<string>;
    report: () => string;
    assertRuns: () => void;
    stop: () => Promise<void>;
  }
  export function startService(plan: { name: string; command: string; args: string[]; logFile: string }): Service;
}
