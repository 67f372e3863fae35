export type Letter = { id: string; subject: string; text: string; html: string; links: string[]; to: string[] };

const inbox = (): string => {
  const url = process.env.MAIL_URL;
  if (!url) throw new Error("MAIL_URL is missing: run these tests through `npm test`");
  return url;
};

async function letters(to: string, more: Record<string, string> = {}): Promise<Letter[]> {
  const response = await fetch(`${inbox()}/api/messages?${new URLSearchParams({ to, ...more })}`);
  return response.json();
}

/** Remembers what is in the inbox, so that the next letter can be told from the ones before. */
export async function newestId(to: string): Promise<string> {
  return (await letters(to)).at(-1)?.id ?? "0";
}

/** The next letter to an address, the moment it arrives. */
export async function nextLetter(to: string, after: string): Promise<Letter> {
  const [letter] = await letters(to, { after, wait: "60" });
  if (!letter) throw new Error(`no letter to ${to} within a minute`);
  return letter;
}

/** The letter to an address whose subject says all these words, the moment it arrives: for inboxes that tests share. */
export async function letterSaying(to: string, ...words: string[]): Promise<Letter> {
  let after = "0";
  for (const end = Date.now() + 60_000; Date.now() < end; ) {
    const found = await letters(to, { after, wait: "10" });
    const letter = found.find(({ subject }) => words.every((word) => subject.includes(word)));
    if (letter) return letter;
    after = found.at(-1)?.id ?? after;
  }
  throw new Error(`no letter to ${to} says ${words.join(", ")} within a minute`);
}

/** A letter byte for byte. */
export const rawLetter = async (id: string): Promise<Buffer> =>
  Buffer.from(await (await fetch(`${inbox()}/messages/${id}/raw`)).arrayBuffer());
