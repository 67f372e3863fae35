/** Verbs of the audit trail as people say them, in the history of a job. */
const WORDS: Record<string, string> = {
  "job.create": "Job made",
  "job.make-due": "Job made from the due list",
  "due.sweep": "Job made ahead, by the agreement",
  "job.update": "Job changed",
  "job.set-terms": "Purchase order or limit written down",
  "job.wait": "Began to wait",
  "job.end-wait": "A wait ended",
  "job.cancel": "Job canceled",
  "job.record-done": "Said to be done",
  "agreement.record-completion": "Said to be done",
  "visit.plan": "Visit booked",
  "visit.book": "Visit booked",
  "visit.move": "Visit moved",
  "visit.swap": "Visits swapped",
  "visit.cancel": "Visit canceled",
  "visit.ask": "Contact asked",
  "visit.answer": "Contact answered",
  "visit.record-answer": "Answer written down",
};

/** A verb that has no words yet is shown by its name: nothing is left out of a history. */
export const historyWords = (command: string): string => WORDS[command] ?? command.replace(/[.-]/g, " ");

export function whoWords(person: string | null, actorKind: string): string {
  if (person) return person;
  return actorKind === "worker" ? "by itself" : actorKind === "link" ? "by a link" : actorKind;
}
