import type { FormAction } from "@/components/form/form";
import { RowAction } from "@/components/form/row-action";
import { Section } from "@/components/layout/page-header";
import { Callout } from "@/components/ui/card";
import { dateWords, toLocalTime } from "@/lib/domain/shared/zone";
import type { SystemFunction } from "@/lib/domain/systems/words";
import type { NoTestDate, TestWindow } from "@/lib/domain/windows/spans";
import { functionsWords, nextOpening, seasonWords, windowWords } from "@/lib/domain/windows/words";
import { Call, Entries, Entry, Nothing } from "./entries";
import { AddAttendance, AddNoTest, AddWindow } from "./window-forms";

type Attendance = {
  id: string;
  functions: SystemFunction[];
  party: string;
  phone: string | null;
  contact: { id: string; name: string; phone: string | null } | null;
};
type Props = {
  siteId: string;
  zone: string;
  now: Date;
  windows: readonly (TestWindow & { id: string; note: string | null })[];
  noTestDates: readonly (NoTestDate & { id: string })[];
  attendances: readonly Attendance[];
  contacts: readonly { id: string; name: string }[];
  mayChange: boolean;
  actions: Record<
    "addWindow" | "endWindow" | "addNoTest" | "endNoTest" | "addAttendance" | "endAttendance",
    FormAction
  >;
};

/** When which functions may operate, when never, and who must stand by. */
export function WindowsSection(props: Props) {
  const { siteId, windows, noTestDates, attendances, contacts, mayChange, actions } = props;
  return (
    <>
      <Section
        title="Test windows"
        note="When the building lets functions really operate. A live block outside of them is refused at booking."
        actions={mayChange && <AddWindow siteId={siteId} action={actions.addWindow} />}
      >
        {windows.length === 0 && (
          <Nothing>No window is agreed. Ask the building, then add when it can live without which function.</Nothing>
        )}
        {windows.length > 0 && (
          <Entries>
            {windows.map((window) => (
              <WindowEntry key={window.id} window={window} {...props} />
            ))}
          </Entries>
        )}
      </Section>
      <div className="grid min-w-0 grid-cols-1 items-start gap-5 lg:grid-cols-2">
        <Section title="No-test dates" actions={mayChange && <AddNoTest siteId={siteId} action={actions.addNoTest} />}>
          {noTestDates.length === 0 && <Nothing>None recorded: exams, holidays, events.</Nothing>}
          {noTestDates.length > 0 && (
            <Entries>
              {noTestDates.map((dates) => (
                <Entry
                  key={dates.id}
                  title={
                    dates.fromDate === dates.toDate
                      ? dateWords(dates.fromDate)
                      : `${dateWords(dates.fromDate)} to ${dateWords(dates.toDate)}`
                  }
                  actions={
                    mayChange && (
                      <RowAction
                        action={actions.endNoTest}
                        name="noTestId"
                        value={dates.id}
                        button="End"
                        confirm={{
                          title: `End: ${dates.reason}?`,
                          description: "Tests can be booked on these dates again.",
                        }}
                      />
                    )
                  }
                >
                  <p>
                    {dates.reason}: {functionsWords(dates.functions)}
                  </p>
                </Entry>
              ))}
            </Entries>
          )}
        </Section>
        <Section
          title="Who must attend"
          actions={mayChange && <AddAttendance {...{ siteId, contacts }} action={actions.addAttendance} />}
        >
          {attendances.length === 0 && (
            <Nothing>Nobody recorded: building engineer, elevator contractor, restart of fans.</Nothing>
          )}
          {attendances.length > 0 && (
            <Entries>
              {attendances.map(({ id, party, functions, contact, phone }) => (
                <Entry
                  key={id}
                  title={party}
                  actions={
                    mayChange && (
                      <RowAction
                        action={actions.endAttendance}
                        name="attendanceId"
                        value={id}
                        button="End"
                        confirm={{
                          title: `${party} need not attend?`,
                          description: "Visits already booked keep their attendees.",
                        }}
                      />
                    )
                  }
                >
                  <p>For {functionsWords(functions)}</p>
                  <p>
                    {contact?.name} <Call phone={phone ?? contact?.phone ?? null} />
                  </p>
                </Entry>
              ))}
            </Entries>
          )}
        </Section>
      </div>
    </>
  );
}

type EntryProps = Props & { window: Props["windows"][number] };

function WindowEntry({ window, noTestDates, now, zone, mayChange, actions }: EntryProps) {
  const season = seasonWords(window);
  const next = nextOpening(window, noTestDates, now, zone);
  return (
    <Entry
      title={windowWords(window)}
      actions={
        mayChange && (
          <RowAction
            action={actions.endWindow}
            name="windowId"
            value={window.id}
            button="End"
            confirm={{
              title: `End the window ${windowWords(window)}?`,
              description: "Visits already booked stay; new ones cannot use it.",
            }}
          />
        )
      }
    >
      <p className="text-text">{functionsWords(window.functions)}</p>
      {(season || window.noticeHours > 0) && (
        <p>{[season, window.noticeHours > 0 && `${window.noticeHours} hours’ notice`].filter(Boolean).join(" · ")}</p>
      )}
      {window.note && <p>{window.note}</p>}
      {next ? (
        <p className="figures">
          {next.startsAt <= now ? "Open now, until " : `Next ${toLocalTime(next.startsAt, zone).replace("T", " ")} to `}
          {toLocalTime(next.endsAt, zone).replace("T", " ")}
        </p>
      ) : (
        <Callout tone="soon">Does not open within two months</Callout>
      )}
    </Entry>
  );
}
