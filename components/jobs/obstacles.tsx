import { CircleAlert } from "lucide-react";
import { TextLink } from "@/components/ui/text-link";
import type { Obstacle } from "@/lib/domain/jobs/stands-in-the-way";

/** What stands in the way; each leads to where it is mended. */
export function Obstacles({ obstacles }: { obstacles: readonly Obstacle[] }) {
  if (obstacles.length === 0) return <span className="text-muted">Nothing</span>;
  return (
    <ul className="grid gap-0.5 text-sm">
      {obstacles.map((obstacle) => (
        <li key={obstacle.code} className="flex items-start gap-1">
          <CircleAlert aria-hidden className="mt-0.5 size-4 shrink-0 text-soon" />
          <TextLink href={obstacle.href} className="font-normal">
            {obstacle.words}
          </TextLink>
        </li>
      ))}
    </ul>
  );
}
