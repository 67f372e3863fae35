const WORDS = {
  moved: {
    title: "This visit has changed",
    more: "A newer letter with the new time has gone to the same address. Please answer that one.",
  },
  canceled: { title: "This visit is canceled", more: "Nobody comes, and nothing operates. You need not do anything." },
  expired: { title: "This visit is over", more: "There is nothing left to answer here." },
  withdrawn: {
    title: "This letter has been replaced",
    more: "A newer letter about the same visit has gone to the same address. Please answer that one.",
  },
} as const;

type Props = { companyName: string; companyPhone: string; reason: keyof typeof WORDS };

/** A link that works no longer says so kindly, and whom to call. */
export function EndedVisitLink({ companyName, companyPhone, reason }: Props) {
  return (
    <>
      <h1 className="text-2xl font-bold">{WORDS[reason].title}</h1>
      <p>{WORDS[reason].more}</p>
      <p>
        Questions? Call {companyName},{" "}
        <a className="figures font-semibold underline" href={`tel:${companyPhone}`}>
          {companyPhone}
        </a>
        .
      </p>
    </>
  );
}
