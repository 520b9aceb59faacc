/**
 * The job queues, made by the migration so that the application's role need not
 * own them. "__pgboss__send-it" is the library's own, through which its clock
 * hands out scheduled jobs; left to itself it would make it at start, which
 * that role may not.
 *
 * Under "short" at most one job with the same key waits; one that a killed worker
 * left half done does not hold up the next.
 */
export const QUEUES = [
  { name: "__pgboss__send-it", options: {} },
  { name: "weekly-digest", options: { policy: "short", retryLimit: 0 } },
  { name: "digest-of-reader", options: { policy: "short", retryLimit: 0 } },
] as const;
