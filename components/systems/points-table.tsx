import type { Search } from "@/components/data-table/address";
import { DataTable } from "@/components/data-table/data-table";
import { FilterSelect, type PageOf, SearchBar } from "@/components/data-table/paged-table";
import type { FormAction } from "@/components/form/form";
import { EmptyState } from "@/components/ui/card";
import type { Point, PointZone, Proof } from "@/lib/domain/systems/device-list";
import { POINT_KIND_WORDS, POINT_KINDS, SIGNAL_WORDS } from "@/lib/domain/systems/words";
import { PointForm, ZoneForm } from "./point-forms";
import { ProofMark } from "./proof-mark";
import { Removal } from "./removal";

type Row = { point: Point; zone: PointZone | null };
type Props = PageOf & {
  systemId: string;
  today: string;
  path: string;
  search: Search;
  rows: readonly Row[];
  zones: readonly PointZone[];
  proofs: Record<string, Proof>;
  mayChange: boolean;
  actions: Record<"savePoint" | "saveZone" | "remove" | "putBack", FormAction>;
};

/** The devices, as one walks past them unless the address says otherwise. */
export function PointsTable(props: Props) {
  const { systemId, zones, proofs, search, path, mayChange, actions, rows } = props;
  const chosen = zones.find(({ id }) => id === search.zone);
  const add = mayChange && (
    <>
      <PointForm action={actions.savePoint} {...{ systemId, zones }} />
      <ZoneForm action={actions.saveZone} systemId={systemId} />
      {chosen && <ZoneForm key={chosen.id} action={actions.saveZone} systemId={systemId} zone={chosen} />}
    </>
  );
  return (
    <DataTable
      {...props}
      caption="Devices"
      rowKey={({ point }) => point.id}
      filters={
        <div className="flex w-full flex-wrap items-end justify-between gap-3">
          <Filters {...{ path, search, zones }} />
          {rows.length > 0 && <div className="flex flex-wrap gap-2">{add}</div>}
        </div>
      }
      empty={
        <EmptyState title="No device yet" action={add}>
          Add what you find while walking, or import the list. A script follows from the devices alone.
        </EmptyState>
      }
      columns={[
        { key: "address", header: "Address", sortable: true, figures: true, cell: ({ point }) => point.address },
        { key: "zone", header: "Zone", sortable: true, cell: ({ zone }) => zone && `${zone.key} ${zone.name}` },
        {
          key: "kind",
          header: "Kind",
          sortable: true,
          cell: ({ point }) =>
            `${POINT_KIND_WORDS[point.kind]}${point.signal === "alarm" ? "" : `, ${SIGNAL_WORDS[point.signal].toLowerCase()}`}`,
        },
        {
          key: "label",
          header: "Text and place",
          sortable: true,
          cell: ({ point }) => (
            <>
              {point.label}
              {point.location && <span className="block text-sm text-muted">{point.location}</span>}
              {point.removedOn && <span className="block text-sm font-semibold">Removed {point.removedOn}</span>}
            </>
          ),
        },
        {
          key: "proven",
          header: "Last seen",
          sortable: true,
          cell: ({ point }) => <ProofMark proof={proofs[point.id]} />,
        },
        ...(mayChange
          ? [{ key: "change", header: "Change", cell: (row: Row) => <Change {...props} row={row} /> }]
          : []),
      ]}
    />
  );
}

const Change = ({ row: { point }, systemId, zones, today, actions }: Props & { row: Row }) => (
  <span className="flex flex-wrap gap-1">
    <PointForm action={actions.savePoint} {...{ systemId, zones, point }} />
    <Removal
      {...{ systemId, today, actions }}
      entry="point"
      id={point.id}
      name={point.address}
      removedOn={point.removedOn}
    />
  </span>
);

const PROOFS = [
  { value: "never", label: "Never proven" },
  { value: "failed", label: "Failed last" },
];
const REMOVED = [{ value: "shown", label: "Shown" }];

const Filters = ({ path, search, zones }: Pick<Props, "path" | "search" | "zones">) => (
  <SearchBar path={path} q={String(search.q ?? "")} label="Address, text or place" sort={search.sort}>
    <FilterSelect
      name="zone"
      label="Zone"
      search={search}
      options={zones.map(({ id, key, name }) => ({ value: id, label: `${key} ${name}` }))}
      all="Every zone"
    />
    <FilterSelect
      name="kind"
      label="Kind"
      search={search}
      options={POINT_KINDS.map((kind) => ({ value: kind, label: POINT_KIND_WORDS[kind] }))}
      all="Every kind"
    />
    <FilterSelect name="proof" label="Last seen" search={search} options={PROOFS} all="Any" />
    <FilterSelect name="removed" label="Removed" search={search} options={REMOVED} all="Hidden" />
  </SearchBar>
);
