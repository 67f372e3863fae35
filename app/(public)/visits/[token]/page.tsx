import type { Metadata } from "next";
import { notFound } from "next/navigation";
import { PublicShell } from "@/components/layout/public-shell";
import { AnswerForm } from "@/components/visits/answer-form";
import { AnswerGiven, AskedVisitFacts, VisitCaution } from "@/components/visits/asked-visit";
import { EndedVisitLink } from "@/components/visits/ended-visit-link";
import { toLocalTime } from "@/lib/domain/shared/zone";
import { getAsked } from "@/lib/services/visits/get-asked";
import { readByLink } from "@/lib/web/link";
import { answerByLinkAction } from "../../actions";

export const metadata: Metadata = { title: "A planned visit", referrer: "no-referrer", robots: "noindex" };

export default async function VisitByLink({ params }: PageProps<"/visits/[token]">) {
  const { token } = await params;
  const found = await readByLink(getAsked, token);
  if ("ended" in found) {
    if (!found.ended) notFound();
    return (
      <PublicShell>
        <EndedVisitLink {...found.ended} />
      </PublicShell>
    );
  }
  const { visit, ask, company } = found.open;
  const answeredOn = ask.answeredAt && toLocalTime(ask.answeredAt, visit.zone);
  return (
    <PublicShell>
      <div>
        <p className="text-muted">{company.name}</p>
        <h1 className="text-2xl font-bold">{ask.answer ? "Thank you" : "Can this visit take place?"}</h1>
      </div>
      <AskedVisitFacts visit={visit} />
      <VisitCaution />
      {ask.answer ? (
        <AnswerGiven ask={ask} on={answeredOn} />
      ) : (
        <AnswerForm action={answerByLinkAction} name="token" value={token} />
      )}
      <p>
        Something else, or another answer? Call {company.name},{" "}
        <a className="figures font-semibold underline" href={`tel:${company.phone}`}>
          {company.phone}
        </a>
        .
      </p>
    </PublicShell>
  );
}
