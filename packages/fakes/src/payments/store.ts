import {
  closeSync,
  existsSync,
  ftruncateSync,
  mkdirSync,
  openSync,
  readFileSync,
  renameSync,
  writeFileSync,
  writeSync,
} from 'node:fs';
import { join } from 'node:path';
import type { Hidden, Kind, Kinds, Row } from './kinds.ts';

/** One line of the journal: what a commit wrote and forgot, in order. */
type Commit = ({ put: Row } | { gone: [Kind, string] })[];

/** Thrown inside `atomically`, keeps what was written so far: a declined card leaves a failed charge behind. */
export interface KeepsChanges {
  keepsChanges: boolean;
}

const COMPACT_ABOVE_COMMITS = 5_000;

/**
 * All objects in memory, each commit appended to a journal before the caller hears of it.
 * A killed process loses at most the commit it had not finished writing; values are replaced, never changed in place.
 */
export class Store {
  readonly #rows = new Map<Kind, Map<string, Row>>();
  readonly #path: string;
  #file: number;
  #open: { commit: Commit; undo: (() => void)[] } | null = null;

  constructor(dir: string) {
    mkdirSync(dir, { recursive: true });
    this.#path = join(dir, 'payments.journal.jsonl');
    const commits = this.#replay();
    if (commits > COMPACT_ABOVE_COMMITS) this.#compact();
    this.#file = openSync(this.#path, 'a');
  }

  /** The object, or undefined. */
  find<K extends Kind>(kind: K, id: string): Kinds[K] | undefined {
    return this.row(kind, id)?.value;
  }

  /** The object with its owner and hidden fields, or undefined. */
  row<K extends Kind>(kind: K, id: string): Row<K> | undefined {
    return this.#rows.get(kind)?.get(id) as Row<K> | undefined;
  }

  /** Every object of a kind, oldest first. */
  all<K extends Kind>(kind: K): Row<K>[] {
    return [...(this.#rows.get(kind)?.values() ?? [])] as Row<K>[];
  }

  /** Writes an object; an existing one keeps its place, its owner and the hidden fields not named. */
  put<K extends Kind>(kind: K, value: Kinds[K], more: { owner?: string | null; hidden?: Hidden } = {}): Kinds[K] {
    const before = this.row(kind, value.id);
    const row: Row<K> = {
      kind,
      id: value.id,
      owner: more.owner ?? before?.owner ?? null,
      value,
      hidden: { ...before?.hidden, ...more.hidden },
    };
    this.atomically(() => {
      this.#set(row as Row);
      this.#open?.commit.push({ put: row as Row });
      this.#open?.undo.push(() => (before ? this.#set(before as Row) : this.#delete(kind, value.id)));
    });
    return value;
  }

  /** Forgets an object; nothing happens when there is none. */
  remove(kind: Kind, id: string): void {
    const before = this.row(kind, id);
    if (!before) return;
    this.atomically(() => {
      this.#delete(kind, id);
      this.#open?.commit.push({ gone: [kind, id] });
      this.#open?.undo.push(() => this.#set(before as Row));
    });
  }

  /**
   * Runs `work` as one commit: all of it reaches the journal or none.
   * A nested call joins the outer one; when it throws, only its own part is undone.
   */
  atomically<T>(work: () => T): T {
    const outer = this.#open;
    const open = (this.#open ??= { commit: [], undo: [] });
    const mark = open.undo.length;
    try {
      const result = work();
      if (!outer) this.#append(open.commit);
      return result;
    } catch (error) {
      if (!(error as Partial<KeepsChanges>).keepsChanges) {
        for (const undo of open.undo.splice(mark).toReversed()) undo();
        open.commit.length = mark;
      }
      if (!outer) this.#append(open.commit);
      throw error;
    } finally {
      this.#open = outer;
    }
  }

  close(): void {
    closeSync(this.#file);
  }

  #append(commit: Commit): void {
    if (commit.length > 0) writeSync(this.#file, `${JSON.stringify(commit)}\n`);
  }

  #set(row: Row): void {
    const ofKind = this.#rows.get(row.kind) ?? new Map<string, Row>();
    this.#rows.set(row.kind, ofKind.set(row.id, row));
  }

  #delete(kind: Kind, id: string): void {
    this.#rows.get(kind)?.delete(id);
  }

  /** Reads the journal and cuts off a last line that a killed process left unfinished. */
  #replay(): number {
    if (!existsSync(this.#path)) return 0;
    const bytes = readFileSync(this.#path);
    const end = bytes.lastIndexOf('\n') + 1;
    if (end < bytes.length) {
      const file = openSync(this.#path, 'r+');
      ftruncateSync(file, end);
      closeSync(file);
    }
    const lines = bytes.subarray(0, end).toString('utf8').split('\n').filter(Boolean);
    for (const line of lines) {
      const commit = JSON.parse(line) as Commit;
      for (const step of commit) {
        if ('put' in step) this.#set(step.put);
        else this.#delete(...step.gone);
      }
    }
    return lines.length;
  }

  #compact(): void {
    const put = [...this.#rows.values()].flatMap((ofKind) => [...ofKind.values()]);
    const fresh = `${this.#path}.new`;
    writeFileSync(fresh, put.map((row) => `${JSON.stringify([{ put: row }])}\n`).join(''));
    renameSync(fresh, this.#path);
  }
}
