/** Runs once as a web process starts: refuses unsafe settings, and brings together what two features need of each other. */
export async function register(): Promise<void> {
  if (process.env.NEXT_RUNTIME === "nodejs") {
    const { assertServable } = await import("@/env");
    assertServable();
    const { lendFindingsToDigest } = await import("@/app/finding-lender");
    lendFindingsToDigest();
  }
}
