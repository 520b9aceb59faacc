import Link from "next/link";
import type { ReactNode } from "react";

type Kind = "next" | "other";

/** Filled for the one next step, outlined for the rest. */
export function ButtonLink({ href, kind = "other", children }: Readonly<{ href: string; kind?: Kind; children: ReactNode }>) {
  return (
    <Link href={href} className={`button button-${kind}`}>
      {children}
    </Link>
  );
}

export function Button({
  kind = "next", isBusy = false, name, value, type = "submit", onClick, children,
}: Readonly<{
  kind?: Kind;
  isBusy?: boolean;
  name?: string;
  value?: string;
  type?: "submit" | "button";
  onClick?: () => void;
  children: ReactNode;
}>) {
  return (
    <button type={type} name={name} value={value} onClick={onClick} aria-disabled={isBusy} className={`button button-${kind}`}>
      {children}
    </button>
  );
}

/** Buttons in a row that wraps. */
export function ButtonRow({ children }: Readonly<{ children: ReactNode }>) {
  return <div className="mt-6 flex flex-wrap gap-3">{children}</div>;
}
