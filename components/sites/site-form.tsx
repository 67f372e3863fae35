"use client";

import { SelectField, TextareaField, TextField } from "@/components/form/field";
import { Form, type FormAction, SubmitButton } from "@/components/form/form";
import { US_STATES } from "@/lib/domain/shared/inputs";
import { SITE_KIND_WORDS, SITE_KINDS, type SiteKind } from "@/lib/domain/sites/words";

type Site = {
  id: string;
  name: string;
  kind: SiteKind;
  street: string;
  city: string;
  state: string;
  postalCode: string;
  zone: string;
  latitude: number | null;
  longitude: number | null;
  accessNote: string | null;
  authorityName: string | null;
  authorityPhone: string | null;
};

type Props = { action: FormAction; zones: readonly string[]; zone: string; site?: Site };

export function SiteForm({ action, zones, zone, site }: Props) {
  return (
    <Form action={action} className="grid max-w-2xl gap-4">
      {site && <input type="hidden" name="siteId" value={site.id} />}
      <TextField label="Name" name="name" defaultValue={site?.name} />
      <SelectField label="Kind" name="kind" defaultValue={site?.kind ?? ""}>
        <option value="">Choose</option>
        {SITE_KINDS.map((kind) => (
          <option key={kind} value={kind}>
            {SITE_KIND_WORDS[kind]}
          </option>
        ))}
      </SelectField>
      <TextField label="Street" name="street" defaultValue={site?.street} autoComplete="off" />
      <div className="grid gap-4 sm:grid-cols-[1fr_6rem_8rem]">
        <TextField label="City" name="city" defaultValue={site?.city} />
        <SelectField label="State" name="state" defaultValue={site?.state ?? ""}>
          <option value="" />
          {US_STATES.map((state) => (
            <option key={state}>{state}</option>
          ))}
        </SelectField>
        <TextField label="Postal code" name="postalCode" defaultValue={site?.postalCode} inputMode="numeric" />
      </div>
      <div className="grid gap-4 sm:grid-cols-2">
        <TextField
          label="Latitude"
          name="latitude"
          optional
          inputMode="decimal"
          defaultValue={site?.latitude?.toString()}
          hint="Travel is reckoned from here"
        />
        <TextField
          label="Longitude"
          name="longitude"
          optional
          inputMode="decimal"
          defaultValue={site?.longitude?.toString()}
          hint="West of Greenwich is negative"
        />
      </div>
      <SelectField label="Time zone" name="zone" defaultValue={site?.zone ?? zone}>
        {zones.map((name) => (
          <option key={name}>{name}</option>
        ))}
      </SelectField>
      <TextareaField
        label="Access"
        name="accessNote"
        defaultValue={site?.accessNote}
        hint="For the crew only. No codes or passwords here."
      />
      <div className="grid gap-4 sm:grid-cols-[1fr_12rem]">
        <TextField
          label="Authority having jurisdiction"
          name="authorityName"
          optional
          defaultValue={site?.authorityName}
        />
        <TextField
          label="Its telephone"
          name="authorityPhone"
          type="tel"
          optional
          defaultValue={site?.authorityPhone}
        />
      </div>
      <SubmitButton>{site ? "Save" : "Add site"}</SubmitButton>
    </Form>
  );
}
