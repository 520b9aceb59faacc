/** By what name the log knows an error, for whoever reports it. */
export function ErrorReference({ error }: Readonly<{ error: unknown }>) {
  const reference = error instanceof Error && "digest" in error && typeof error.digest === "string" ? error.digest : null;
  if (!reference) return null;
  return <p className="mt-6 text-note text-soft">If it goes on, report this number: <span className="font-mono break-all select-all">{reference}</span></p>;
}
