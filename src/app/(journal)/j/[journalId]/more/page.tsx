import type { Metadata } from "next";
import Link from "next/link";
import { Page } from "@/components/page";
import { journalHeader } from "@/features/days/queries/journal-header";
import { forPage } from "@/lib/action";

export const metadata: Metadata = { title: "More" };

const ROOMS = [
  { path: "plan", label: "Plan", hint: "Phases, tasks and follow-ups", isForHelpers: true },
  { path: "fallback", label: "Fallback card", hint: "The way back, and whom to call", isForHelpers: true },
  { path: "start/about-you", label: "Starting profile", hint: "The pages that work it out", isForHelpers: false },
  { path: "circle/comments", label: "Comments and questions", hint: "What was said, and what waits for an answer", isForHelpers: true },
  { path: "circle", label: "Circle", hint: "Who helps, and what each sees", isForHelpers: false },
  { path: "data", label: "Data", hint: "Glucose files in", isForHelpers: false },
] as const;

export default async function MorePage({ params }: Readonly<{ params: Promise<{ journalId: string }> }>) {
  const { journalId } = await params;
  const header = await forPage((ctx) => journalHeader(ctx, { journalId }));
  const rooms = ROOMS.filter((room) => room.isForHelpers || header.role === "person");
  return (
    <Page title="More of this notebook.">
      <ul className="mt-6 max-w-text">
        {rooms.map(({ path, label, hint }) => (
          <li key={path} className="border-b border-hairline">
            <Link href={`/j/${journalId}/${path}`} className="flex min-h-target flex-col justify-center py-2.5">
              <span className="font-semibold">{label}</span>
              <span className="text-note text-soft">{hint}</span>
            </Link>
          </li>
        ))}
        <li className="border-b border-hairline">
          <Link href="/journals" className="flex min-h-target items-center font-semibold">All journals</Link>
        </li>
        <li className="border-b border-hairline">
          <Link href="/account" className="flex min-h-target items-center font-semibold">Account</Link>
        </li>
        <li>
          <Link href="/help" className="flex min-h-target items-center font-semibold">Help</Link>
        </li>
      </ul>
    </Page>
  );
}
