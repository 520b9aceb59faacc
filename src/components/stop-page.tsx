import type { ReactNode } from "react";
import { Page } from "./page";
import { Shell } from "./shell";

const HELP = [{ href: "/help", label: "Help", isCurrent: false }];

/** A page that could not be shown: what is the case, and what to do next. */
export function StopPage({ title, lead, children }: Readonly<{ title: string; lead: ReactNode; children?: ReactNode }>) {
  return (
    <Shell home="/" words={[]} more={HELP}>
      <Page title={title} lead={lead}>{children}</Page>
    </Shell>
  );
}
