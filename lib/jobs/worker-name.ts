/** What a worker's connections are called in pg_stat_activity, by which the health of the queue is told. */
export const WORKER_NAME = "boardwake-worker";
