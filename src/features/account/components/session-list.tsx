import { PressButton } from "@/components/form/press-button";
import { dateTimeText } from "@/domain/day-text";
import { endSessionAction } from "../actions";

type Session = Readonly<{ id: string; createdAt: Date; userAgent: string }>;

/** Where an account is signed in; every place but the present one can be signed out. */
export function SessionList({
  sessions, presentId, timeZone,
}: Readonly<{ sessions: ReadonlyArray<Session>; presentId: string | null; timeZone: string }>) {
  return (
    <ul className="max-w-text">
      {sessions.map((session) => (
        <li key={session.id} className="flex flex-wrap items-center justify-between gap-3 border-b border-hairline py-2">
          <span className="min-w-0 break-words">
            {deviceText(session.userAgent)} <span className="block text-note text-soft">since {dateTimeText(session.createdAt, timeZone)}</span>
          </span>
          {session.id === presentId
            ? <span className="text-note text-soft">this one</span>
            : <PressButton action={endSessionAction} label="Sign it out" hidden={{ sessionId: session.id }} look="link" />}
        </li>
      ))}
    </ul>
  );
}

/** A device in plain words, from what its browser says of itself. */
function deviceText(userAgent: string): string {
  if (/mobi|android|ip(hone|ad)|tablet/i.test(userAgent)) return "A browser on a phone or tablet";
  return /^mozilla/i.test(userAgent) ? "A browser on a computer" : "A program";
}
