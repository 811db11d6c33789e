declare module '*/scripts/postgres/cluster.mjs' {
  export interface Cluster {
    readonly dir: string;
  }
  export function openCluster(options: { fast: boolean }): Cluster;
  export function startCluster(cluster: Cluster): Promise<void>;
}

declare module '*/scripts/postgres/database.mjs' {
  interface Place {
    cluster: object;
    database: string;
  }
  export function ensureDatabase(place: Place): void;
  export function dropDatabase(place: Place): void;
  export function databaseUrls(
    place: Place,
  ): Record<'DATABASE_URL' | 'DATABASE_OWNER_URL' | 'JOBS_DATABASE_URL' | 'ADMIN_DATABASE_URL', string>;
}
