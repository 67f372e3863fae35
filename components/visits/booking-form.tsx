"use client";

import { useQuery } from "@tanstack/react-query";
import { useDeferredValue, useState } from "react";
import { Field } from "@/components/form/field";
import { Form, SubmitButton } from "@/components/form/form";
import { Callout } from "@/components/ui/card";
import { Checkbox, Choice, ChoiceGroup } from "@/components/ui/choice";
import { Input, Select } from "@/components/ui/input";
import { REASON_FIELD, type SlotReasonCode } from "@/lib/domain/visits/words";
import { type Places, type Placing, reasonsQuery, type Sheet, type Wanted } from "@/lib/queries/visits";
import { LiveBlockFields } from "./live-block-fields";
import { ReasonsAt } from "./reasons-at";
import { formAction, usePosting } from "./use-posting";

type Props = {
  wanted: Wanted;
  /** Of the visit that moves, as it was seen. */
  sequence?: number;
  places: Pick<Places, "site" | "functions" | "crewSize" | "contacts">;
  technicians: Sheet["technicians"];
  initial: Placing;
  button?: React.Ref<HTMLButtonElement>;
  onDone: (message: string) => void;
};

/** Everything about one attendance, with what stands against it at the field that can mend it. */
export function BookingForm({ wanted, sequence, places, technicians, initial, button, onDone }: Props) {
  const post = usePosting();
  const [placing, setPlacing] = useState(initial);
  const [notes, setNotes] = useState<Partial<Record<SlotReasonCode, string>>>({});
  const [ask, setAsk] = useState(() => places.contacts.filter(({ email }) => email).map(({ id }) => id));
  const { data } = useQuery(reasonsQuery(wanted, useDeferredValue(placing)));
  const reasons = data?.reasons ?? [];
  const moves = "visitId" in wanted;

  const save = formAction(async () => {
    const overrides = Object.entries(notes).flatMap(([code, note]) =>
      note?.trim() && reasons.some((reason) => reason.code === code) ? [{ code, note }] : [],
    );
    if (moves) await post(`/api/visits/${wanted.visitId}/move`, { ...placing, sequence, overrides });
    else await post("/api/visits", { ...wanted, ...placing, overrides, ask });
    onDone(moves ? "The visit has moved" : "The visit is booked");
    return undefined;
  });

  const at = (field: (typeof REASON_FIELD)[SlotReasonCode]) => (
    <ReasonsAt
      reasons={reasons.filter(({ code }) => REASON_FIELD[code] === field)}
      notes={notes}
      onNote={(code, note) => setNotes({ ...notes, [code]: note })}
    />
  );
  const setCrew = (i: number, id: string) => {
    const crew = placing.crew.filter((one, k) => k !== i && one !== id);
    setPlacing({ ...placing, crew: id ? [...crew.slice(0, i), id, ...crew.slice(i)] : crew });
  };
  const places_ = Math.max(places.crewSize, placing.crew.length) + 1;

  return (
    <Form action={save} className="grid gap-4">
      <div className="grid gap-3 sm:grid-cols-[1fr_7rem]">
        <Field label="Start" name="startsLocal" hint={`By the clock at ${places.site.name}`}>
          {(control) => (
            <Input
              {...control}
              defaultValue={undefined}
              type="datetime-local"
              value={placing.startsLocal}
              onChange={(event) => setPlacing({ ...placing, startsLocal: event.target.value.slice(0, 16) })}
            />
          )}
        </Field>
        <Field label="Minutes" name="minutes">
          {(control) => (
            <Input
              {...control}
              defaultValue={undefined}
              type="number"
              min={5}
              step={15}
              value={placing.minutes}
              onChange={(event) => setPlacing({ ...placing, minutes: event.target.valueAsNumber || 0 })}
            />
          )}
        </Field>
      </div>
      {at("startsLocal")}
      {Array.from({ length: places_ }, (_, i) => i).map((i) => (
        <Field
          key={i}
          label={i === 0 ? "Leads" : "Goes along"}
          name={i === 0 ? "crew" : `crew.${i}`}
          optional={i >= places.crewSize}
        >
          {(control) => (
            <Select
              {...control}
              defaultValue={undefined}
              value={placing.crew[i] ?? ""}
              onChange={(event) => setCrew(i, event.target.value)}
            >
              <option value="">Nobody</option>
              {technicians.map(({ id, name }) => (
                <option key={id} value={id}>
                  {name}
                </option>
              ))}
            </Select>
          )}
        </Field>
      ))}
      {at("crew")}
      <LiveBlockFields
        functions={places.functions}
        startsLocal={placing.startsLocal}
        blocks={placing.liveBlocks}
        onChange={(liveBlocks) => setPlacing({ ...placing, liveBlocks })}
      />
      {at("liveBlocks")}
      {!moves && (
        <ChoiceGroup legend="Who is asked to agree, by e-mail">
          {places.contacts.length === 0 && (
            <p className="text-sm text-muted">Nobody speaks for this site yet: add a contact with the customer.</p>
          )}
          {places.contacts.map(({ id, name, email, phone }) => (
            <Choice key={id} hint={email ?? `no e-mail address; call ${phone ?? ""}`}>
              <Checkbox
                checked={ask.includes(id)}
                onChange={() => setAsk(ask.includes(id) ? ask.filter((one) => one !== id) : [...ask, id])}
              />
              {name}
            </Choice>
          ))}
        </ChoiceGroup>
      )}
      {moves && <Callout>Everybody who was asked is told, and asked again.</Callout>}
      <SubmitButton ref={button}>{moves ? "Move it here" : "Book it"}</SubmitButton>
    </Form>
  );
}
