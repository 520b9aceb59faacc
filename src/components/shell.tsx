import Link from "next/link";
import type { ReactNode } from "react";
import { Wordmark } from "./wordmark";

export type NavWord = Readonly<{ href: string; label: string; isCurrent: boolean }>;

/**
 * The frame of every page: the notched rule at the left edge from top to bottom,
 * a line of words above, and on a phone a bar of words below.
 */
export function Shell({
  home, words, more, phoneWords, children, footer,
}: Readonly<{
  home: string;
  words: ReadonlyArray<NavWord>;
  /** Words at the right end of the line. */
  more: ReadonlyArray<NavWord>;
  /** The five words of the phone's bar; none hides the bar. */
  phoneWords?: ReadonlyArray<NavWord>;
  children: ReactNode;
  footer?: ReactNode;
}>) {
  return (
    <div className="relative min-h-dvh">
      <a href="#main" className="button button-next absolute top-2 left-12 z-20 -translate-y-24 focus:translate-y-0">
        To the page
      </a>
      <div aria-hidden="true" className="pointer-events-none absolute inset-y-0 left-rule-phone w-0.5 bg-ink desk:left-rule" />
      <div className="pr-4 pl-8 desk:pr-8 desk:pl-[4.4rem]">
        <header className="no-print flex min-h-14 flex-wrap items-center gap-x-7 border-b border-hairline">
          <Wordmark href={home} />
          <nav aria-label="Main" className={phoneWords ? "hidden desk:block" : ""}>
            <ul className="flex flex-wrap gap-x-6">{words.map((word) => <NavItem key={word.href} {...word} />)}</ul>
          </nav>
          <ul className="ml-auto flex flex-wrap gap-x-6">{more.map((word) => <NavItem key={word.href} {...word} />)}</ul>
        </header>
        <main id="main" tabIndex={-1} className="pt-7 pb-28 outline-none desk:pt-10 desk:pb-16">
          {children}
        </main>
        {footer}
      </div>
      {phoneWords ? <PhoneBar words={phoneWords} /> : null}
    </div>
  );
}

function NavItem({ href, label, isCurrent }: NavWord) {
  return (
    <li className="relative">
      <Link
        href={href}
        aria-current={isCurrent ? "page" : undefined}
        className={`inline-flex min-h-target items-center text-[0.94rem] ${isCurrent ? "text-ink" : "text-soft hover:text-ink"}`}
      >
        {label}
      </Link>
      {isCurrent ? <span aria-hidden="true" className="absolute bottom-0.5 left-0 h-[3px] w-4 bg-ink" /> : null}
    </li>
  );
}

function PhoneBar({ words }: { words: ReadonlyArray<NavWord> }) {
  return (
    <nav aria-label="Main, on a phone" className="no-print fixed inset-x-0 bottom-0 z-10 border-t border-edge bg-paper desk:hidden">
      <ul className="grid grid-cols-5">
        {words.map(({ href, label, isCurrent }) => (
          <li key={label} className="relative">
            <Link
              href={href}
              aria-current={isCurrent ? "page" : undefined}
              className={`flex min-h-12 items-center justify-center text-note ${isCurrent ? "font-semibold text-ink" : "text-soft"}`}
            >
              {label}
            </Link>
            {isCurrent ? <span aria-hidden="true" className="absolute top-0 left-1/2 h-[3px] w-5 -translate-x-1/2 bg-ink" /> : null}
          </li>
        ))}
      </ul>
    </nav>
  );
}
