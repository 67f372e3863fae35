"use client";

import { Undo2 } from "lucide-react";
import { useEffect, useMemo, useState } from "react";
import { Button } from "@/components/ui/button";
import { Callout, EmptyState } from "@/components/ui/card";
import { TextLink } from "@/components/ui/text-link";
import { difference } from "@/lib/domain/sequences/matrix";
import { paths } from "@/lib/domain/shared/paths";
import { Legend } from "./legend";
import type { MatrixFacts, Pen } from "./matrix-facts";
import { MatrixGrid } from "./matrix-grid";
import { PenBar } from "./pen-bar";
import { byPlace, inputOf, proofsByPlace, rowsOf } from "./rows";
import { SaveMatrix } from "./save-matrix";
import { useMatrix } from "./use-matrix";

const FIRST_PEN: Pen = { signal: "alarm", source: "approved_sequence", delaySeconds: 0 };

type Props = { systemId: string; matrix: MatrixFacts; mayChange: boolean };

/** One version of the matrix; the newest can be changed, and what was changed becomes the next. */
export function MatrixEditor({ systemId, matrix, mayChange }: Props) {
  const { version, newest, zones, groups, points } = matrix;
  const saved = version?.cells ?? [];
  const state = useMatrix(saved);
  const [pen, setPen] = useState(FIRST_PEN);
  const [open, setOpen] = useState<ReadonlySet<string>>(new Set());
  const proofs = useMemo(() => proofsByPlace(matrix), [matrix]);
  const { cells } = state;
  const rows = useMemo(() => rowsOf(matrix, cells.values(), open), [matrix, cells, open]);
  const places = useMemo(() => byPlace(cells.values()), [cells]);
  useLeaveWarning(state.unsaved.size > 0);
  if (groups.length === 0 || zones.length + points.length === 0)
    return <NothingToCross systemId={systemId} groups={groups.length} />;
  const names = new Map([
    ...zones.map((zone) => [zone.id, `zone ${zone.key}`] as const),
    ...points.map((point) => [point.id, point.address] as const),
    ...groups.map((group) => [group.id, group.name] as const),
  ]);
  const changes = difference(saved, [...cells.values()], (id) => names.get(id) ?? "unknown");
  return (
    <div className="grid min-w-0 grid-cols-1 gap-3">
      <VersionNote {...{ systemId, version, newest }} />
      {mayChange && <PenBar pen={pen} onChange={setPen} />}
      <MatrixGrid
        rows={rows}
        groups={groups}
        cells={places}
        proofs={proofs}
        unsaved={state.unsaved}
        editable={mayChange}
        onPress={(row, group) => mayChange && state.press({ ...inputOf(row), groupId: group.id }, pen)}
        onOpen={(zoneId) => setOpen((now) => toggled(now, zoneId))}
        onUndo={state.undo}
      />
      <Legend />
      {mayChange && (
        <p className="text-sm text-muted">
          Arrow keys move, Space or Enter writes or clears a cell, on a zone’s name opens it; Ctrl+Z takes the last step
          back.
        </p>
      )}
      {changes.length > 0 && (
        <section
          aria-label="Not saved yet"
          className="sticky bottom-4 z-10 flex flex-wrap items-center justify-between gap-3 rounded-lg border border-soon bg-surface px-4 py-3 max-lg:bottom-20"
        >
          <p role="status" className="font-semibold">
            <span className="figures">{changes.length}</span> {changes.length === 1 ? "change" : "changes"} not saved
          </p>
          <div className="flex flex-wrap gap-2">
            <Button onClick={state.undo} disabled={!state.mayUndo}>
              <Undo2 aria-hidden className="size-4" />
              Undo
            </Button>
            <Button onClick={state.discard}>Discard all</Button>
            <SaveMatrix {...{ systemId, changes }} basedOn={newest} removed={state.removed} added={state.added} />
          </div>
        </section>
      )}
    </div>
  );
}

const toggled = (set: ReadonlySet<string>, one: string): ReadonlySet<string> =>
  set.has(one) ? new Set([...set].filter((each) => each !== one)) : new Set([...set, one]);

type NoteProps = Pick<MatrixFacts, "version" | "newest"> & { systemId: string };

function VersionNote({ systemId, version, newest }: NoteProps) {
  if (!version) return <p className="text-muted">No version yet. Mark what operates what, then save the first.</p>;
  if (version.number < newest) {
    return (
      <Callout tone="soon" title={`Version ${version.number}, not in force`}>
        <p>
          {version.note} <TextLink href={paths.systemMatrix(systemId)}>To version {newest}, in force</TextLink>
        </p>
      </Callout>
    );
  }
  return (
    <p className="text-muted">
      Version <span className="figures">{version.number}</span> by {version.author}: {version.note}
    </p>
  );
}

function NothingToCross({ systemId, groups }: { systemId: string; groups: number }) {
  return groups === 0 ? (
    <EmptyState
      title="No output group to operate"
      action={<TextLink href={paths.systemOutputs(systemId)}>Add output groups</TextLink>}
    />
  ) : (
    <EmptyState
      title="No input yet"
      action={<TextLink href={paths.system(systemId)}>Add zones and devices</TextLink>}
    />
  );
}

/** The browser asks before changes are lost. */
function useLeaveWarning(unsaved: boolean) {
  useEffect(() => {
    if (!unsaved) return;
    const warn = (event: BeforeUnloadEvent) => event.preventDefault();
    window.addEventListener("beforeunload", warn);
    return () => window.removeEventListener("beforeunload", warn);
  }, [unsaved]);
}
