import type { ReactNode } from "react";

/** A message that follows something the reader did; announced to screen readers. */
export function Notice({ children }: Readonly<{ children: ReactNode }>) {
  return (
    <div role="status" className="my-5 max-w-text border-l-4 border-range py-1 pl-4">
      {children}
    </div>
  );
}

/** An empty place, written as help: what will stand here and what comes first. */
export function Empty({ title, children }: Readonly<{ title: string; children: ReactNode }>) {
  return (
    <div className="mt-6 max-w-text border-y border-hairline py-5">
      <p className="font-semibold">{title}</p>
      <div className="mt-1 text-soft">{children}</div>
    </div>
  );
}
