"use client";

import { FieldShell } from "@/components/layout/field-shell";
import { Button } from "@/components/ui/button";
import { Callout } from "@/components/ui/card";
import { FIELD_WORDS_EN as WORDS } from "@/lib/domain/field/words";

export default function FieldError({ retry }: { error: unknown; retry: () => void }) {
  return (
    <FieldShell title={WORDS.trouble} items={[]} words={{ skip: WORDS.skip, main: WORDS.main }}>
      <Callout tone="alert">
        <p>{WORDS.troubleNext}</p>
        <Button size="thumb" onClick={retry}>
          {WORDS.tryAgain}
        </Button>
      </Callout>
    </FieldShell>
  );
}
