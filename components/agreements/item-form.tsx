"use client";

import { useState } from "react";
import { RadioField, SelectField, TextField } from "@/components/form/field";
import { Form, type FormAction, SubmitButton } from "@/components/form/form";
import { FunctionsField } from "@/components/form/functions-field";
import { type SiteChoice, SiteField } from "@/components/form/site-field";
import { ruleWords } from "@/lib/domain/agreements/due-words";
import { BY_AGREEMENT, intervalRule, RULE_KEYS } from "@/lib/domain/agreements/interval-rules";
import {
  ANCHOR_WORDS,
  type Anchor,
  FREQUENCIES,
  FREQUENCY_WORDS,
  type Frequency,
  FUNCTIONS_OF_TEST,
  TEST_KIND_WORDS,
  TEST_KINDS,
  type TestKind,
} from "@/lib/domain/agreements/words";
import { dollarsOf } from "@/lib/domain/shared/money";
import type { SystemFunction } from "@/lib/domain/systems/words";

export type FormItem = {
  id: string;
  systemId: string | null;
  testKind: TestKind;
  functions: SystemFunction[];
  frequency: Frequency;
  rule: string;
  toleranceDays: number | null;
  anchor: Anchor;
  anchorOn: string;
  visitMinutes: number;
  crewSize: number;
  priceCents: number;
  systems: readonly { id: string; name: string }[];
};

type Props = { action: FormAction } & (
  | { agreementId: string; sites: readonly SiteChoice[]; item?: undefined }
  | { item: FormItem; agreementId?: undefined; sites?: undefined }
);

/** What is tested where, how often, by which rule, and for how much. */
export function ItemForm({ action, agreementId, sites, item }: Props) {
  const [site, setSite] = useState<SiteChoice | null>(null);
  const [testKind, setTestKind] = useState<TestKind>(item?.testKind ?? "whole_system");
  const [functions, setFunctions] = useState<SystemFunction[]>(item?.functions ?? [...FUNCTIONS_OF_TEST[testKind]]);
  const [frequency, setFrequency] = useState<Frequency>(item?.frequency ?? "annual");
  const [rule, setRule] = useState<string>(item?.rule ?? "nfpa_72");
  const systems = item?.systems ?? site?.systems ?? [];
  const speaking = RULE_KEYS.filter((key) => intervalRule(key, 0).tolerances[frequency]);
  const applied = speaking.find((key) => key === rule) ?? BY_AGREEMENT;
  const ofRule = intervalRule(applied, null);
  return (
    <Form action={action} className="grid max-w-3xl gap-4" onDone={() => setSite(null)}>
      {item ? (
        <input type="hidden" name="itemId" value={item.id} />
      ) : (
        <>
          <input type="hidden" name="agreementId" value={agreementId} />
          <SiteField chosen={site} onChoose={setSite} offered={sites} />
        </>
      )}
      <div className="grid gap-4 sm:grid-cols-2">
        <SelectField
          label="Kind of test"
          name="testKind"
          defaultValue={testKind}
          onChange={({ target }) => {
            setTestKind(target.value as TestKind);
            setFunctions([...FUNCTIONS_OF_TEST[target.value as TestKind]]);
          }}
        >
          {TEST_KINDS.map((kind) => (
            <option key={kind} value={kind}>
              {TEST_KIND_WORDS[kind]}
            </option>
          ))}
        </SelectField>
        {systems.length > 0 ? (
          <SelectField label="System" name="systemId" defaultValue={item?.systemId ?? ""}>
            <option value="">The whole site</option>
            {systems.map((system) => (
              <option key={system.id} value={system.id}>
                {system.name}
              </option>
            ))}
          </SelectField>
        ) : (
          <input type="hidden" name="systemId" value="" />
        )}
      </div>
      <FunctionsField
        legend="What really operates"
        hint="These need a test window at the site. A test that operates nothing can be done at any hour."
        value={functions}
        onChange={setFunctions}
      />
      <div className="grid gap-4 sm:grid-cols-2">
        <SelectField
          label="How often"
          name="frequency"
          defaultValue={frequency}
          onChange={({ target }) => setFrequency(target.value as Frequency)}
        >
          {FREQUENCIES.map((one) => (
            <option key={one} value={one}>
              {FREQUENCY_WORDS[one]}
            </option>
          ))}
        </SelectField>
        <SelectField
          label="By which rule"
          name="rule"
          defaultValue={applied}
          onChange={({ target }) => setRule(target.value)}
        >
          {speaking.map((key) => (
            <option key={key} value={key}>
              {intervalRule(key, 0).title}
            </option>
          ))}
        </SelectField>
      </div>
      {applied === BY_AGREEMENT ? (
        <TextField
          label="Days either way"
          name="toleranceDays"
          inputMode="numeric"
          defaultValue={String(item?.toleranceDays ?? 14)}
          className="max-w-32"
        />
      ) : (
        <p className="text-sm text-muted">
          {ruleWords(ofRule, frequency)}. For: {ofRule.jurisdiction}. Local codes and the authority having jurisdiction
          decide which rule holds.{" "}
          {ofRule.source && (
            <a href={ofRule.source} className="underline" rel="noreferrer" target="_blank">
              Source
            </a>
          )}
        </p>
      )}
      <div className="grid gap-4 sm:grid-cols-2">
        <RadioField
          label="The next one counts"
          name="anchor"
          defaultValue={item?.anchor ?? "fixed"}
          options={(["fixed", "last_done"] as const).map((value) => ({ value, label: ANCHOR_WORDS[value] }))}
        />
        <TextField label="First target date" name="anchorOn" type="date" defaultValue={item?.anchorOn} />
        {!item && (
          <TextField
            label="Last done"
            name="lastDoneOn"
            type="date"
            optional
            hint="By whom ever; the first window counts from it"
          />
        )}
      </div>
      <div className="grid gap-4 sm:grid-cols-3">
        <TextField
          label="Minutes on site"
          name="visitMinutes"
          inputMode="numeric"
          defaultValue={String(item?.visitMinutes ?? 240)}
        />
        <TextField label="People" name="crewSize" inputMode="numeric" defaultValue={String(item?.crewSize ?? 2)} />
        <TextField
          label="Price of each, in dollars"
          name="price"
          inputMode="decimal"
          defaultValue={item ? dollarsOf(item.priceCents) : undefined}
        />
      </div>
      <SubmitButton className="justify-self-start">{item ? "Save" : "Add to the agreement"}</SubmitButton>
    </Form>
  );
}
