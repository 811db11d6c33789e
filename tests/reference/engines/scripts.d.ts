declare module '*/scripts/checks/browser.mjs' {
  export function ensureBrowser(): string;
}
