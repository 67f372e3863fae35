import type { FormAction } from "@/components/form/form";
import { RowAction } from "@/components/form/row-action";
import { Card } from "@/components/ui/card";
import { browserWords } from "@/lib/domain/people/browser-words";

type Session = { id: string; browser: string | null; since: Date; here: boolean };

/** Where somebody is signed in, newest first. */
export function Sessions({ sessions, end }: { sessions: Session[]; end: FormAction }) {
  return (
    <ul className="grid gap-2">
      {sessions.map((session) => (
        <li key={session.id}>
          <Card className="flex flex-wrap items-center justify-between gap-2 p-3 sm:p-3">
            <p>
              {browserWords(session.browser)}
              <span className="block text-sm text-muted">
                since <span className="figures">{session.since.toISOString().slice(0, 10)}</span>
              </span>
            </p>
            {session.here ? (
              <span className="font-semibold">This browser</span>
            ) : (
              <RowAction action={end} name="sessionId" value={session.id} button="Sign out there" />
            )}
          </Card>
        </li>
      ))}
    </ul>
  );
}
