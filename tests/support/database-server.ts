import type { TestProject } from 'vitest/node';
import { removeCluster, removeStaleTestClusters, startCluster } from '../../scripts/lib/cluster.mjs';

declare module 'vitest' {
  interface ProvidedContext {
    /** Connects as the owner of a PostgreSQL server of this run alone. */
    adminUrl: string;
  }
}

/** One PostgreSQL server for the whole run, without any safety against a power cut; gone afterwards. */
export default async function databaseServer(project: TestProject): Promise<() => Promise<void>> {
  await removeStaleTestClusters();
  const name = `test-${process.pid}`;
  const cluster = await startCluster({ name, fast: true });
  project.provide('adminUrl', cluster.adminUrl);
  return async () => {
    await cluster.stop();
    await removeCluster(name);
  };
}
