import type { Instrumentation } from "next";

/** Runs once as a web process starts: refuses unsafe settings, and brings together what two features need of each other. */
export async function register(): Promise<void> {
  if (process.env.NEXT_RUNTIME === "nodejs") {
    const { assertServable } = await import("@/env");
    assertServable();
    const { lendFindingsToDigest } = await import("@/app/finding-lender");
    lendFindingsToDigest();
  }
}

/** One line for a request that broke, under the reference its error page shows; the route's pattern, never the address asked for. */
export const onRequestError: Instrumentation.onRequestError = async (error, request, context) => {
  if (process.env.NEXT_RUNTIME !== "nodejs") return;
  const { errorFields, logEvent } = await import("@/lib/log");
  const reference = error instanceof Error && "digest" in error ? String(error.digest) : "";
  logEvent("error", "page.failed", {
    requestId: [request.headers["x-request-id"] ?? ""].flat()[0] ?? "",
    reference, route: context.routePath, kind: context.routeType, method: request.method, ...errorFields(error),
  });
};
