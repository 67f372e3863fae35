const quietSeconds = 15;

const secondsSince = (from) => Math.round((performance.now() - from) / 100) / 10;

/** A failure that the person at the terminal can act on: shown without a stack. */
export class Explained extends Error {}

export const say = (line = "") => console.log(line);

export function sayFailure(error) {
  say(error instanceof Explained ? `\n${error.message}` : `\n${error?.stack ?? error}`);
}

let innermost;

/** One line when a step begins, one when it ends, and a sign of life while it takes long. */
export async function step(title, work) {
  const from = performance.now();
  say(`→ ${title}`);
  const outer = innermost;
  innermost = title;
  const alive = setInterval(() => {
    if (innermost === title) say(`  … ${title}: ${Math.round(secondsSince(from))} s`);
  }, quietSeconds * 1000);
  try {
    const result = await work();
    say(`✓ ${title}${typeof result === "string" ? `: ${result}` : ""} (${secondsSince(from)} s)`);
    return result;
  } catch (error) {
    say(`✗ ${title} (${secondsSince(from)} s)`);
    throw error;
  } finally {
    innermost = outer;
    clearInterval(alive);
  }
}
