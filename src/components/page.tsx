import type { ReactNode } from "react";

/**
 * One page: a heading that states the finding or the task, a column of reading
 * width, and a margin column that folds under it on a phone.
 */
export function Page({
  eyebrow, title, lead, margin, children,
}: Readonly<{ eyebrow?: ReactNode; title: string; lead?: ReactNode; margin?: ReactNode; children?: ReactNode }>) {
  return (
    <div className="desk:grid desk:grid-cols-[minmax(0,1fr)_15.5rem] desk:gap-x-11 max-w-[70rem]">
      <div className="min-w-0">
        {eyebrow ? <p className="mb-2 text-note text-soft">{eyebrow}</p> : null}
        <h1 className="text-page">{title}</h1>
        {lead ? <div className="mt-3 max-w-text text-base">{lead}</div> : null}
        {children}
      </div>
      {margin ? <aside aria-label="Notes in the margin" className="mt-10 min-w-0 desk:mt-0">{margin}</aside> : null}
    </div>
  );
}

/** A part of a page under its own heading. */
export function Section({ title, id, children }: Readonly<{ title: string; id?: string; children: ReactNode }>) {
  return (
    <section className="mt-9" aria-labelledby={id}>
      <h2 id={id} className="mb-2 text-section">{title}</h2>
      {children}
    </section>
  );
}

/** A note in the margin: what changed, what was used, how it was worked out, a caution. */
export function MarginNote({ title, children }: Readonly<{ title: string; children: ReactNode }>) {
  return (
    <section className="border-t border-hairline py-3.5 text-note text-soft">
      <h2 className="mb-1 font-sans text-note font-semibold text-ink">{title}</h2>
      {children}
    </section>
  );
}
