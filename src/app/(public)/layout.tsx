import type { ReactNode } from "react";
import { Shell } from "@/components/shell";

const WORDS = [
  { href: "/about", label: "What it is", isCurrent: false },
  { href: "/how-it-compares", label: "How it compares", isCurrent: false },
  { href: "/help", label: "Help", isCurrent: false },
];

export default function PublicLayout({ children }: Readonly<{ children: ReactNode }>) {
  return (
    <Shell home="/" words={WORDS} more={[{ href: "/sign-in", label: "Sign in", isCurrent: false }]}>
      {children}
    </Shell>
  );
}
