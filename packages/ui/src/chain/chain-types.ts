export interface ChainStep {
  name: string;
  /** When it happened, or what it will be; one short line. */
  note?: string;
  state: 'done' | 'now' | 'todo';
}
