import type { ReactNode } from "react";
import { Shell } from "@/components/shell";
import { requestContext } from "@/lib/request-context";

const WORDS = [
  { href: "/about", label: "What it is", isCurrent: false },
  { href: "/how-it-compares", label: "How it compares", isCurrent: false },
  { href: "/help", label: "Help", isCurrent: false },
];
const SIGN_IN = { href: "/sign-in", label: "Sign in", isCurrent: false };
const JOURNALS = { href: "/journals", label: "Journals", isCurrent: false };

export default async function PublicLayout({ children }: Readonly<{ children: ReactNode }>) {
  const { actor } = await requestContext();
  return (
    <Shell home="/" words={WORDS} more={[actor.type === "user" ? JOURNALS : SIGN_IN]}>
      {children}
    </Shell>
  );
}
