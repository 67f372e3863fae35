import { Facts, Section } from "@/components/layout/page-header";
import { Card } from "@/components/ui/card";
import { SITE_KIND_WORDS, type SiteKind } from "@/lib/domain/sites/words";
import { Call } from "./entries";

type Place = {
  kind: SiteKind;
  street: string;
  city: string;
  state: string;
  postalCode: string;
  zone: string;
  key: string | null;
  authorityName: string | null;
  authorityPhone: string | null;
};

export function PlaceSection({ site }: { site: Place }) {
  return (
    <Section title="Place">
      <Card>
        <Facts
          rows={[
            ["Address", `${site.street}, ${site.city}, ${site.state} ${site.postalCode}`],
            ["Kind", SITE_KIND_WORDS[site.kind]],
            ["Time zone", site.zone],
            [
              "Authority",
              site.authorityName && (
                <>
                  {site.authorityName} <Call phone={site.authorityPhone} />
                </>
              ),
            ],
            ...(site.key
              ? [["Key in lists", site.key] as const].map(([term, fact]): [string, string] => [term, fact])
              : []),
          ]}
        />
      </Card>
    </Section>
  );
}
