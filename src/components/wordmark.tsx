import Link from "next/link";

/** The brand: the word beside a piece of the rule. */
export function Wordmark({ href }: { href: string }) {
  return (
    <Link href={href} className="inline-flex min-h-target items-center font-serif text-section font-[650]">
      Notchbook
    </Link>
  );
}
