import Link from "next/link";
import { Section } from "@/components/layout/page-header";
import { Card, EmptyState } from "@/components/ui/card";
import type { LicenseState } from "@/lib/domain/people/license-state";
import { paths } from "@/lib/domain/shared/paths";
import { LicenseBadge } from "./license-badge";

type Props = {
  licenses: {
    memberId: string;
    name: string;
    kind: string;
    jurisdiction: string;
    expiresOn: string;
    state: LicenseState;
  }[];
  failedDeliveries: number;
  visitsNextSevenDays: number;
};

export function Attention({ licenses, failedDeliveries, visitsNextSevenDays }: Props) {
  return (
    <>
      <div className="grid gap-3 sm:grid-cols-2">
        <Figure value={visitsNextSevenDays} words="visits in the next seven days" href={paths.runSheet()} />
        <Figure value={failedDeliveries} words="deliveries that failed for good" href={paths.deliveries} />
      </div>
      <Section title="Licenses that end within 60 days, or have ended">
        {licenses.length === 0 ? (
          <EmptyState title="None">Every recorded license is good for longer than 60 days.</EmptyState>
        ) : (
          <ul className="grid gap-2">
            {licenses.map((license) => (
              <li key={license.memberId + license.expiresOn}>
                <Card className="grid items-center justify-items-start gap-x-4 gap-y-2 p-3 sm:grid-cols-[12rem_1fr_auto] sm:p-3">
                  <Link href={paths.person(license.memberId)} className="font-semibold hover:underline">
                    {license.name}
                  </Link>
                  <span>
                    {license.kind}, {license.jurisdiction}, <span className="figures">{license.expiresOn}</span>
                  </span>
                  <LicenseBadge state={license.state} />
                </Card>
              </li>
            ))}
          </ul>
        )}
      </Section>
    </>
  );
}

function Figure({ value, words, href }: { value: number; words: string; href: string }) {
  return (
    <Link href={href} className="rounded-lg border border-line bg-surface p-4 hover:border-text">
      <span className="figures block text-3xl font-bold">{value}</span>
      {words}
    </Link>
  );
}
