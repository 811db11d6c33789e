import { createStore, delMany, get, keys, set, type UseStore } from 'idb-keyval';

/**
 * What this device keeps until the market has it, in the browser's database. Keys begin with the member's id. Every call
 * settles: a browser that keeps nothing (private windows) answers as if it were empty.
 */
export interface DeviceStore {
  read: <T>(key: string) => Promise<T | undefined>;
  /** False when the device would not keep it. */
  write: (key: string, value: unknown) => Promise<boolean>;
  remove: (keys: string[]) => Promise<void>;
  keys: (prefix: string) => Promise<string[]>;
}

/** Opens a store of its own database, so that two stores never wait for each other's upgrade. */
export function openDeviceStore(name: string): DeviceStore {
  let opened: UseStore | undefined;
  const store = () => (opened ??= createStore(`lydite-${name}`, 'kept'));
  const attempt = async <T>(run: () => Promise<T>, otherwise: T): Promise<T> => {
    try {
      return await run();
    } catch {
      return otherwise;
    }
  };
  return {
    read: (key) => attempt(() => get(key, store()), undefined),
    write: (key, value) => attempt(() => set(key, value, store()).then(() => true), false),
    remove: (all) => attempt(() => delMany(all, store()), undefined),
    keys: (prefix) => attempt(async () => (await keys<string>(store())).filter((key) => key.startsWith(prefix)), []),
  };
}

/** Leaves nothing of members who used this device before. */
export async function forgetOthers(store: DeviceStore, memberId: string): Promise<void> {
  const all = await store.keys('');
  await store.remove(all.filter((key) => !key.startsWith(`${memberId}/`)));
}
