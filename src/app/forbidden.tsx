import Link from "next/link";
import { Page } from "@/components/page";
import { Shell } from "@/components/shell";

export default function Forbidden() {
  return (
    <Shell home="/" words={[]} more={[{ href: "/help", label: "Help", isCurrent: false }]}>
      <Page title="Your role does not include this." lead={<p>What a helper sees is up to the person. Ask them, or go back to <Link className="link" href="/journals">your notebooks</Link>.</p>} />
    </Shell>
  );
}
