"use client";

import { toast } from "sonner";
import type { Search } from "@/components/data-table/address";
import { DataTable } from "@/components/data-table/data-table";
import { SearchBar } from "@/components/data-table/paged-table";
import { Avatar } from "@/components/ui/avatar";
import { Badge } from "@/components/ui/badge";
import { Breadcrumb } from "@/components/ui/breadcrumb";
import { Button } from "@/components/ui/button";
import { Callout, Card, EmptyState } from "@/components/ui/card";
import { Figures } from "@/components/ui/figures";
import { Progress } from "@/components/ui/progress";
import { Separator } from "@/components/ui/separator";
import { PageSkeleton } from "@/components/ui/skeleton";
import { Spinner } from "@/components/ui/spinner";
import { Group } from "./group";

export function Told() {
  return (
    <>
      <Group title="States, by word and glyph">
        <Badge tone="settled">Proven 2026-03-14</Badge>
        <Badge tone="soon">Due in 9 days</Badge>
        <Badge tone="alert">Failed</Badge>
        <Badge>Never proven</Badge>
      </Group>
      <Group title="Said on the page">
        <Callout title="For your information">Fans restart with the panel's reset.</Callout>
        <Callout tone="soon" title="Soon">
          The window opens in two hours.
        </Callout>
        <Callout tone="alert" title="Not normal">
          The account is on test.
        </Callout>
        <Button onClick={() => toast.success("Saved.")}>Say it passing by</Button>
      </Group>
      <Group title="Cards, nothing yet, still coming">
        <Card className="w-full">A card</Card>
        <EmptyState title="No visits yet" action={<Button>Plan one</Button>}>
          What to do next stands here.
        </EmptyState>
        <div className="w-full">
          <PageSkeleton />
        </div>
        <Spinner label="Looking" />
        <Progress label="Importing" value={40} max={100} className="w-full" />
      </Group>
      <Group title="Figures, people, way here">
        <Figures>1,280.00</Figures>
        <Avatar name="Ruth Adeyemi" />
        <Breadcrumb trail={[{ label: "Sites", href: "/design" }]} />
        <Separator />
      </Group>
      <Group title="A list, one with nothing that fits, one with nothing yet">
        <Fans rows={FANS} />
        <Fans rows={[]} search={{ q: "boiler" }} />
        <Fans rows={[]} />
      </Group>
    </>
  );
}

const FANS = [
  { tag: "SF-3", floor: "Roof", seconds: 42 },
  { tag: "EF-11", floor: "Basement", seconds: 118 },
];

function Fans({ rows, search = { sort: "tag" } }: { rows: typeof FANS; search?: Search }) {
  const path = "/design";
  return (
    <div className="w-full">
      <DataTable
        {...{ rows, path, search, page: 1, pageSize: 25, total: rows.length }}
        caption="Fans"
        rowKey={(fan) => fan.tag}
        filters={<SearchBar path={path} label="Tag" />}
        exportHref={path}
        empty={<EmptyState title="No fans yet">Import the device list.</EmptyState>}
        columns={[
          { key: "tag", header: "Tag", sortable: true, figures: true, cell: (fan) => fan.tag },
          { key: "floor", header: "Floor", sortable: true, cell: (fan) => fan.floor },
          { key: "seconds", header: "Coast-down, s", figures: true, end: true, cell: (fan) => fan.seconds },
        ]}
      />
    </div>
  );
}
