import { Card, EmptyState } from "@/components/ui/card";
import { TextLink } from "@/components/ui/text-link";
import { paths } from "@/lib/domain/shared/paths";
import { toLocalTime, type Zone } from "@/lib/domain/shared/zone";

type Version = {
  number: number;
  note: string;
  at: Date;
  author: string;
  cells: number;
  changes: readonly string[];
  changesLeftOut: number;
};

/** Who changed the matrix when and why, and what. */
export function VersionsList({
  systemId,
  zone,
  versions,
}: {
  systemId: string;
  zone: Zone;
  versions: readonly Version[];
}) {
  if (versions.length === 0) {
    return (
      <EmptyState
        title="No version yet"
        action={<TextLink href={paths.systemMatrix(systemId)}>To the matrix</TextLink>}
      >
        Each save of the matrix becomes a version that can be read back.
      </EmptyState>
    );
  }
  return (
    <ol reversed start={versions.length} className="grid gap-3">
      {versions.map(({ number, note, at, author, cells, changes, changesLeftOut }, i) => (
        <li key={number}>
          <Card className="grid gap-2">
            <div className="flex flex-wrap items-baseline justify-between gap-2">
              <h2 className="font-bold">
                Version <span className="figures">{number}</span>
                {i === 0 && ", in force"}
              </h2>
              <TextLink href={paths.systemMatrix(systemId, number)}>Look at version {number}</TextLink>
            </div>
            <p>{note}</p>
            <p className="text-sm text-muted">
              {author}, <span className="figures">{toLocalTime(at, zone).replace("T", " ")}</span>,{" "}
              <span className="figures">{cells}</span> cells
            </p>
            <details>
              <summary className="cursor-pointer">What changed ({changes.length + changesLeftOut})</summary>
              <ul className="grid gap-0.5 pt-1 text-sm">
                {changes.map((words) => (
                  <li key={words}>{words}</li>
                ))}
                {changesLeftOut > 0 && <li>and {changesLeftOut} more</li>}
              </ul>
            </details>
          </Card>
        </li>
      ))}
    </ol>
  );
}
