import { PrintButton } from "@/components/form/print-button";
import { Section } from "@/components/layout/page-header";
import { Badge } from "@/components/ui/badge";
import { Callout, EmptyState } from "@/components/ui/card";
import { equipmentMissing, type InputStep, type LiveStep, type TestScript } from "@/lib/domain/sequences/test-script";
import { ACTION_WORDS, EXPECTATION_SOURCE_WORDS, POINT_KIND_WORDS, SIGNAL_WORDS } from "@/lib/domain/systems/words";

type Props = { script: TestScript & { matrixVersion: number | null } };

/** The script as it follows from what is known now; to be read on paper too. */
export function ScriptView({ script }: Props) {
  const { rule, matrixVersion, inputs, live, notes } = script;
  return (
    <div className="grid gap-5">
      <div className="flex flex-wrap items-start justify-between gap-3">
        <p className="max-w-prose text-muted">
          {rule.name}, {rule.edition};{" "}
          {matrixVersion === null ? "no matrix" : `expectations of matrix version ${matrixVersion}`}. A help, not an
          instruction: each device’s own instructions, the edition in force, the authority having jurisdiction and the
          licensed person on site decide.
        </p>
        {inputs.length + live.length > 0 && <PrintButton>Print the script</PrintButton>}
      </div>
      {notes.map((note) => (
        <Callout key={note} tone="soon">
          {note}
        </Callout>
      ))}
      {inputs.length === 0 && <EmptyState title="No input to test yet">Add devices, here or while walking.</EmptyState>}
      {inputs.length > 0 && (
        <Section
          title="1. Inputs, one by one"
          note="With functions kept quiet where that is allowed. Match each to the panel’s text and the station’s log."
        >
          <ol className="grid rounded-lg border border-line bg-surface print:border-0">
            {inputs.map((step) => (
              <Input key={step.point.id} step={step} />
            ))}
          </ol>
        </Section>
      )}
      {live.length > 0 && (
        <Section
          title="2. Functions, live, in one batch"
          note="Inside a test window, with those present who must attend. Panel logs alone do not prove that anything happened."
        >
          <ol className="grid gap-3">
            {live.map((step) => (
              <Live key={step.number} step={step} />
            ))}
          </ol>
        </Section>
      )}
    </div>
  );
}

const Lock = ({ reason }: { reason: string }) => (
  <Badge tone="alert" className="whitespace-normal">
    {reason}
  </Badge>
);

const Input = ({ step: { number, point, zone, method, locked } }: { step: InputStep }) => (
  <li className="grid grid-cols-[2.5rem_1fr] gap-x-2 border-line px-3 py-2 not-last:border-b break-inside-avoid sm:grid-cols-[2.5rem_16rem_1fr]">
    <span className="figures text-muted">{number}</span>
    <p>
      <span className="figures font-semibold">{point.address}</span> {point.label}
      <span className="block text-sm text-muted">
        {[POINT_KIND_WORDS[point.kind], zone && `zone ${zone.key}`, point.location].filter(Boolean).join(", ")}
      </span>
    </p>
    <div className="max-sm:col-start-2">
      <p>{method.how}.</p>
      <p className="text-sm text-muted">{method.leavesOpen}.</p>
      {locked && <Lock reason={locked} />}
    </div>
  </li>
);

const Live = ({ step: { number, by, signal, operates, locked } }: { step: LiveStep }) => (
  <li className="grid gap-2 rounded-lg border border-line bg-surface px-4 py-3 break-inside-avoid">
    <p>
      <span className="figures text-muted">{number}</span>{" "}
      {by ? (
        <>
          {SIGNAL_WORDS[signal]} at <span className="figures font-semibold">{by.address}</span> {by.label}
        </>
      ) : (
        <>{SIGNAL_WORDS[signal]} at an input that is not on the list: find out which</>
      )}
    </p>
    {locked && <Lock reason={locked} />}
    <ul className="grid gap-2 pl-4">
      {operates.map((operation) => {
        const { group, source, delaySeconds, equipment } = operation;
        return (
          <li key={group.id}>
            <span className="font-semibold">{group.name}</span>{" "}
            {delaySeconds > 0 && <span className="figures">after {delaySeconds} s</span>}
            <span className="text-sm text-muted"> {EXPECTATION_SOURCE_WORDS[source].toLowerCase()}</span>
            <ul className="pl-4 text-sm">
              {equipment.map(({ id, tag, action, longestOffMinutes }) => (
                <li key={id}>
                  <span className="figures">{tag}</span> {ACTION_WORDS[action]}
                  {longestOffMinutes !== null && `, off at most ${longestOffMinutes} min`}
                </li>
              ))}
              {equipmentMissing(operation) && (
                <li className="text-muted">No equipment recorded: write down what operates</li>
              )}
            </ul>
          </li>
        );
      })}
    </ul>
  </li>
);
