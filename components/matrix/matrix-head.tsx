// biome-ignore-all lint/a11y/useSemanticElements: most rows are not drawn, which a table element cannot tell
import { ChevronDown, ChevronRight } from "lucide-react";
import { cn } from "@/components/ui/cn";
import type { OutputGroup } from "@/lib/domain/systems/device-list";
import { FUNCTION_WORDS } from "@/lib/domain/systems/words";
import type { MatrixRow } from "./rows";

const corner = "sticky left-0 z-10 w-40 shrink-0 border-r border-b border-line bg-sunken px-2 text-left sm:w-72";

export const MatrixHead = ({ groups }: { groups: readonly OutputGroup[] }) => (
  // biome-ignore lint/a11y/useFocusableInteractive: column heads are read with each cell
  <div role="row" aria-rowindex={1} className="sticky top-0 z-20 flex h-16 w-max">
    {/* biome-ignore lint/a11y/useFocusableInteractive: see above */}
    <div role="columnheader" aria-colindex={1} className={cn(corner, "z-30 grid content-end pb-1 text-sm text-muted")}>
      Input
    </div>
    {groups.map((group, i) => (
      // biome-ignore lint/a11y/useFocusableInteractive: see above
      <div
        key={group.id}
        role="columnheader"
        aria-colindex={i + 2}
        title={`${group.name}: ${FUNCTION_WORDS[group.function]}`}
        className="grid w-24 shrink-0 content-end overflow-hidden border-r border-b border-line bg-sunken px-1 pb-1 text-center text-sm leading-tight"
      >
        <span className="line-clamp-2 font-semibold">{group.name}</span>
        <span className="truncate text-muted">{FUNCTION_WORDS[group.function]}</span>
      </div>
    ))}
  </div>
);

/** Names the input; a zone opens to its devices. */
export function RowHead({ row, index, active }: { row: MatrixRow; index: number; active: boolean }) {
  const zone = row.kind === "zone";
  const Arrow = zone && row.open ? ChevronDown : ChevronRight;
  const words = zone ? `Zone ${row.key} ${row.label}, ${row.devices} devices` : `${row.key} ${row.label}`;
  return (
    <div
      role="rowheader"
      aria-colindex={1}
      aria-expanded={zone ? row.open : undefined}
      aria-label={words}
      title={words}
      tabIndex={active ? 0 : -1}
      data-place={`${index}:0`}
      className={cn(
        corner,
        "flex items-center gap-1 -outline-offset-3",
        zone ? "cursor-pointer font-semibold" : "pl-7",
      )}
    >
      {zone && <Arrow aria-hidden className="size-4 shrink-0" />}
      <span className="figures shrink-0">{row.key}</span>
      <span className="truncate">{row.label}</span>
      {!zone && row.removed && <span className="text-sm text-alert">removed</span>}
    </div>
  );
}
