import Link from "next/link";
import { Page } from "@/components/page";
import { Shell } from "@/components/shell";

export default function NotFound() {
  return (
    <Shell home="/" words={[]} more={[{ href: "/help", label: "Help", isCurrent: false }]}>
      <Page title="Nothing here, or not shared with you." lead={<p>The address may be old, or what it led to is not shared with you any more. <Link className="link" href="/journals">Your notebooks</Link></p>} />
    </Shell>
  );
}
