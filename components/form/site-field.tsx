"use client";

import { useQuery } from "@tanstack/react-query";
import { Command } from "cmdk";
import { useDeferredValue, useEffect, useRef, useState } from "react";
import { Button } from "@/components/ui/button";
import { Input } from "@/components/ui/input";
import type { SiteBrief } from "@/lib/domain/shared/found";
import { findQuery } from "@/lib/queries/find";
import { Field } from "./field";

/** What is offered before anything is typed knows less of a site than what the search answers. */
export type SiteChoice = Pick<SiteBrief, "id" | "name" | "street" | "city" | "systems"> & Partial<SiteBrief>;

type Props = {
  chosen: SiteChoice | null;
  onChoose: (site: SiteChoice | null) => void;
  /** Offered before anything is typed. */
  offered?: readonly SiteChoice[];
  autoFocus?: boolean;
};

/** A site found by typing a part of its name, street or city; arrows and Enter choose. Posts `siteId`. */
export function SiteField({ chosen, onChoose, offered = [], autoFocus }: Props) {
  const [typed, setTyped] = useState("");
  const [focused, setFocused] = useState(false);
  const q = useDeferredValue(typed.trim());
  const { data, isFetching } = useQuery(findQuery(q));
  const box = useRef<HTMLInputElement>(null);
  const change = useRef<HTMLButtonElement>(null);
  const moved = useRef(false);
  useEffect(() => {
    if (moved.current) (chosen ? change.current : box.current)?.focus();
    moved.current = false;
  }, [chosen]);
  const found: readonly SiteChoice[] = q.length >= 2 ? (data?.sites ?? []) : offered;
  const choose = (site: SiteChoice | null) => {
    moved.current = true;
    setTyped("");
    setFocused(false);
    onChoose(site);
  };
  return (
    <Field label="Site" name="siteId" hint={chosen ? undefined : "Type a part of the name or the street"}>
      {({ name, defaultValue: _, ...control }) => (
        <>
          <input type="hidden" name={name} value={chosen?.id ?? ""} />
          {chosen ? (
            <div className="flex flex-wrap items-center justify-between gap-2 rounded-md border border-field-line bg-surface px-3 py-1.5">
              <span>
                <span className="font-semibold">{chosen.name}</span>
                <span className="block text-sm text-muted">
                  {chosen.street}, {chosen.city}
                </span>
              </span>
              <Button {...control} ref={change} size="small" onClick={() => choose(null)}>
                Other site
              </Button>
            </div>
          ) : (
            <Command shouldFilter={false} label="Site">
              <Command.Input asChild value={typed} onValueChange={setTyped}>
                <Input
                  {...control}
                  ref={box}
                  autoFocus={autoFocus}
                  autoComplete="off"
                  onFocus={() => setFocused(true)}
                  onBlur={() => setFocused(false)}
                />
              </Command.Input>
              <Command.List
                // What was typed is answered, wherever the focus is by then.
                hidden={q.length < 2 && !(focused && offered.length > 0)}
                // A press would take the focus away before it is counted as a choice.
                onMouseDown={(event) => event.preventDefault()}
                className="mt-1 max-h-72 overflow-y-auto rounded-md border border-line bg-surface p-1"
              >
                {found.map((site) => (
                  <Command.Item
                    key={site.id}
                    value={site.id}
                    onSelect={() => choose(site)}
                    className="cursor-pointer rounded px-3 py-2 aria-selected:bg-sunken aria-selected:shadow-[inset_3px_0_0_var(--still)]"
                  >
                    <span className="font-semibold">{site.name}</span>
                    <span className="block text-sm text-muted">
                      {site.street}, {site.city}
                    </span>
                  </Command.Item>
                ))}
                {found.length === 0 && (
                  <p className="px-3 py-2 text-muted">{isFetching ? "Looking…" : "No site by that name."}</p>
                )}
              </Command.List>
            </Command>
          )}
        </>
      )}
    </Field>
  );
}
