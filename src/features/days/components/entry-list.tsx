import { PressButton } from "@/components/form/press-button";
import { entryText } from "@/domain/journal/entry-text";
import { clockText } from "@/domain/settings/clock-text";
import { removeEntryAction } from "../actions";
import type { DayView } from "../queries/days";

export function EntryList({ view, mayRemove }: Readonly<{ view: DayView; mayRemove: boolean }>) {
  if (view.entries.length === 0) return <p className="text-soft">Nothing logged.</p>;
  return (
    <ul className="max-w-text">
      {view.entries.map((entry) => (
        <li key={entry.id} className="flex items-center gap-4 border-b border-hairline py-1.5">
          <span className="w-14 shrink-0">{clockText(entry.minute)}</span>
          <span className="min-w-0 grow whitespace-pre-line">{entryText(entry.data)}</span>
          {mayRemove ? <PressButton action={removeEntryAction} label="remove" look="link" hidden={{ journalId: view.journal.id, entryId: entry.id }} /> : null}
        </li>
      ))}
    </ul>
  );
}
