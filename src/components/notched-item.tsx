import type { ReactNode } from "react";

type Notch = "in-effect" | "past" | "waiting" | "fallback";

const LOOK: Readonly<Record<Notch, string>> = {
  "in-effect": "w-3.5 border-t-[4px] border-solid desk:w-7",
  past: "w-3 border-t-[2px] border-solid desk:w-6",
  waiting: "w-3 border-t-[2px] border-dashed desk:w-6",
  fallback: "w-2 border-t-[2px] border-solid desk:w-3.5",
};

/** One place on the rule: its number left of the rule, its notch on it, what hangs off it at the right. */
export function NotchedItem({ number, notch, children }: Readonly<{ number: string; notch: Notch; children: ReactNode }>) {
  return (
    <li className="relative border-t border-hairline py-5">
      <span aria-hidden="true" className="absolute top-6 -left-[1.12rem] desk:-left-[2.22rem]">
        <span className={`block border-ink ${LOOK[notch]}`} />
        <span className="absolute -top-3.5 right-[calc(100%+0.35rem)] hidden font-serif text-section desk:block">{number}</span>
      </span>
      {children}
    </li>
  );
}
