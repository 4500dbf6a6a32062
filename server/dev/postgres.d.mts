/** A running private PostgreSQL. */
export type Cluster = {
  /** The connection URL of one of its databases, as its superuser. */
  url(database: string): string;
  port: number;
  dataDir: string;
  /** It ran already and was joined, not started. */
  wasRunning: boolean;
  /** Makes the database unless it is there. */
  createDatabase(name: string): Promise<void>;
  isRunning(): boolean;
  /** Stops the server and keeps the data. */
  stop(): Promise<void>;
  /** Stops the server and removes the data. */
  destroy(): Promise<void>;
};

/** Starts the cluster in `dataDir`, making it first when it is missing or half made, or joins it when it runs. */
export function startCluster(options: {
  dataDir: string;
  tune: "dev" | "test";
  onProgress?: (text: string) => void;
}): Promise<Cluster>;

/** The folder of PostgreSQL's server programs, or undefined when they are missing. */
export function findServerPrograms(major?: string): string | undefined;

/** A folder for a throw-away cluster of this process; `label` tells several of one process apart. */
export function testDataDir(label?: string): string;

/** Ends and removes throw-away clusters whose process died without tidying up. */
export function cleanStaleTestClusters(): Promise<void>;

/** Removes the cluster wanted at `dataDir`, running or not, with all its data. */
export function destroyCluster(dataDir: string): Promise<void>;
