"use client";

import { useMutation } from "@tanstack/react-query";
import { useRouter } from "next/navigation";
import { useId, useState } from "react";
import { toast } from "sonner";
import { Button } from "@/components/ui/button";
import { Callout } from "@/components/ui/card";
import { Dialog, DialogActions, DialogContent, DialogTrigger } from "@/components/ui/dialog";
import { Textarea } from "@/components/ui/input";
import { Label } from "@/components/ui/label";
import type { MatrixCell } from "@/lib/domain/sequences/matrix";
import { saveMatrix } from "@/lib/queries/matrix";

const WORDS_SHOWN = 12;

type Props = {
  systemId: string;
  basedOn: number;
  removed: readonly MatrixCell[];
  added: readonly MatrixCell[];
  /** What changed, in words. */
  changes: readonly string[];
};

/** Asks why, shows what changed, appends a version. */
export function SaveMatrix({ systemId, basedOn, removed, added, changes }: Props) {
  const [note, setNote] = useState("");
  const id = useId();
  const router = useRouter();
  const save = useMutation({
    mutationFn: () => saveMatrix(systemId, { basedOn, note, removed, added }),
    onSuccess: ({ number }) => {
      toast.success(`Version ${number} saved`);
      router.refresh();
    },
  });
  return (
    <Dialog onOpenChange={() => save.reset()}>
      <DialogTrigger asChild>
        <Button variant="primary">Save as version {basedOn + 1}</Button>
      </DialogTrigger>
      <DialogContent title={`Save as version ${basedOn + 1}`} description="Older versions stay and can be looked at.">
        <form
          className="grid gap-4"
          onSubmit={(event) => {
            event.preventDefault();
            if (!save.isPending) save.mutate();
          }}
        >
          {save.error && (
            <Callout tone="alert" role="alert">
              {save.error.message}
            </Callout>
          )}
          <div className="grid gap-1">
            <Label htmlFor={id}>Why, and by what paper</Label>
            <Textarea id={id} required value={note} onChange={(event) => setNote(event.target.value)} />
          </div>
          <ul className="grid max-h-48 gap-1 overflow-y-auto text-sm">
            {changes.slice(0, WORDS_SHOWN).map((words) => (
              <li key={words}>{words}</li>
            ))}
            {changes.length > WORDS_SHOWN && <li>and {changes.length - WORDS_SHOWN} more</li>}
          </ul>
          <DialogActions>
            <Button type="submit" variant="primary" pending={save.isPending}>
              Save version
            </Button>
          </DialogActions>
        </form>
      </DialogContent>
    </Dialog>
  );
}
