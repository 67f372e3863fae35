import type { FormAction } from "@/components/form/form";
import { RowAction } from "@/components/form/row-action";
import { Section } from "@/components/layout/page-header";
import { DOCUMENT_KIND_WORDS, type DocumentKind } from "@/lib/domain/sites/words";
import { AddDocument } from "./access-forms";
import { Entries, Entry, Nothing } from "./entries";

type Props = {
  siteId: string;
  documents: readonly { id: string; kind: DocumentKind; title: string; dated: string | null; keptWhere: string }[];
  mayChange: boolean;
  actions: { add: FormAction; end: FormAction };
};

export const PapersSection = ({ siteId, documents, mayChange, actions }: Props) => (
  <Section title="Documents" actions={mayChange && <AddDocument siteId={siteId} action={actions.add} />}>
    {documents.length === 0 && (
      <Nothing>None recorded. The sequence of operation and the last record help most.</Nothing>
    )}
    {documents.length > 0 && (
      <Entries>
        {documents.map(({ id, kind, title, dated, keptWhere }) => (
          <Entry
            key={id}
            title={title}
            actions={
              mayChange && (
                <RowAction
                  action={actions.end}
                  name="documentId"
                  value={id}
                  button="Take off"
                  confirm={{
                    title: `Take ${title} off the list?`,
                    description: "It is no longer valid, or no longer there.",
                  }}
                />
              )
            }
          >
            <p>
              {DOCUMENT_KIND_WORDS[kind]}
              {dated && (
                <>
                  , <span className="figures">{dated}</span>
                </>
              )}
              . {keptWhere}
            </p>
          </Entry>
        ))}
      </Entries>
    )}
  </Section>
);
