"use client";

import { Printer } from "lucide-react";
import { Button, IconButton } from "@/components/ui/button";
import { Kbd } from "@/components/ui/kbd";
import { Pagination } from "@/components/ui/pagination";
import { TextLink } from "@/components/ui/text-link";
import { Group } from "./group";

const VARIANTS = ["primary", "quiet", "danger", "plain"] as const;
const SIZES = ["small", "normal", "thumb"] as const;

export function Actions() {
  return (
    <>
      {SIZES.map((size) => (
        <Group key={size} title={`Buttons, ${size}`}>
          {VARIANTS.map((variant) => (
            <Button key={variant} variant={variant} size={size}>
              {variant}
            </Button>
          ))}
          <Button size={size} disabled>
            disabled
          </Button>
          <Button size={size} pending>
            pending
          </Button>
        </Group>
      ))}
      <Group title="Icon button, link, key">
        <IconButton label="Print">
          <Printer aria-hidden className="size-4" />
        </IconButton>
        <TextLink href="/design">A link among words</TextLink>
        <Kbd>Enter</Kbd>
      </Group>
      <Group title="Pages">
        <Pagination page={2} last={9} hrefOf={() => "/design"}>
          <span className="figures">214</span> in all
        </Pagination>
      </Group>
    </>
  );
}
