export interface Cluster {
  url: string;
  adminUrl: string;
  stop: () => Promise<void>;
}
export function startCluster(options: {
  name: string;
  fast?: boolean;
  onExit?: (code: number | null) => void;
}): Promise<Cluster>;
export function removeStaleTestClusters(): Promise<void>;
export function removeCluster(name: string): Promise<void>;
