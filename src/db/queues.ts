/**
 * The job queues, made by the migration so that the application's role need not
 * own them. "__pgboss__send-it" is the library's own, through which its clock
 * hands out scheduled jobs; left to itself it would make it at start, which
 * that role may not.
 *
 * Under "stately" at most one job with the same key waits and one is worked on.
 */
export const QUEUES = [
  { name: "__pgboss__send-it", options: {} },
  { name: "weekly-digest", options: { policy: "stately", retryLimit: 0 } },
  { name: "digest-of-reader", options: { policy: "stately", retryLimit: 3, retryDelay: 30, retryBackoff: true } },
] as const;
