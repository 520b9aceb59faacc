import type { Metadata } from "next";
import Link from "next/link";
import { StopPage } from "@/components/stop-page";

export const metadata: Metadata = { title: "Not part of your role" };

export default function Forbidden() {
  return (
    <StopPage
      title="Your role does not include this."
      lead={<p>What a helper sees is up to the person. Ask them, or go back to <Link className="link" href="/journals">your notebooks</Link>.</p>}
    />
  );
}
