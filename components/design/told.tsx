"use client";

import { toast } from "sonner";
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
import { Table, Td, Th } from "@/components/ui/table";
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
      <Group title="A table">
        <Table>
          <thead>
            <tr>
              <Th>Tag</Th>
              <Th>Seconds</Th>
            </tr>
          </thead>
          <tbody>
            <tr>
              <Td>SF-3</Td>
              <Td className="figures">42</Td>
            </tr>
          </tbody>
        </Table>
      </Group>
    </>
  );
}
