import Link from "next/link";
import { MarginNote } from "./page";

/** The caution that stands beside every figure and setting. */
export function Caution({ fallbackHref }: Readonly<{ fallbackHref?: string }>) {
  return (
    <MarginNote title="Not medical advice">
      <p>
        A licensed professional who knows you decides. Your written plan and local rules come first. Severe low: glucagon and your
        local emergency number. Ketones or high glucose: your sick-day plan. Nothing here is sent to a device.
      </p>
      {fallbackHref ? (
        <p className="mt-1.5">
          <Link className="link" href={fallbackHref}>Fallback card</Link>
        </p>
      ) : null}
    </MarginNote>
  );
}

/** What stands with every careful start: weaker is not free of danger. */
export function TooWeakCaution() {
  return (
    <MarginNote title="Too weak is not safe either">
      <p>
        With too little insulin, ketones can build up. Glucose that stays high: check ketones and the infusion site, and follow your
        sick-day plan. A line that does not deliver looks the same as a setting that is too weak.
      </p>
    </MarginNote>
  );
}
