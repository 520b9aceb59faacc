import type { Metadata } from "next";
import Link from "next/link";
import { StopPage } from "@/components/stop-page";

export const metadata: Metadata = { title: "Not here" };

export default function NotFound() {
  return (
    <StopPage
      title="Nothing here, or not shared with you."
      lead={<p>The address may be old, or what it led to is not shared with you any more. Go on to <Link className="link" href="/journals">your notebooks</Link>.</p>}
    />
  );
}
