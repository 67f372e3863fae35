const BROWSERS = [
  ["Edg/", "Edge"],
  ["Firefox/", "Firefox"],
  ["Chrome/", "Chrome"],
  ["Safari/", "Safari"],
] as const;
const MACHINES = [
  ["iPhone", "iPhone"],
  ["iPad", "iPad"],
  ["Android", "Android"],
  ["Windows", "Windows"],
  ["Mac OS", "Mac"],
  ["Linux", "Linux"],
] as const;

const firstIn = (text: string, words: readonly (readonly [string, string])[]) =>
  words.find(([mark]) => text.includes(mark))?.[1];

/** A User-Agent field (RFC 9110, 10.1.5) as a person would say it; only to tell one's own browsers apart. */
export function browserWords(userAgent: string | null): string {
  const browser = firstIn(userAgent ?? "", BROWSERS) ?? "A browser";
  const machine = firstIn(userAgent ?? "", MACHINES);
  return machine ? `${browser} on ${machine}` : browser;
}
