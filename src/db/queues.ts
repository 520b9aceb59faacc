/** The job queues, made by the migration so that the application's role need not own them. */
export const QUEUES = [
  { name: "weekly-digest", options: { policy: "singleton", retryLimit: 3 } },
  { name: "outbox-sweep", options: { policy: "singleton", retryLimit: 0 } },
] as const;
