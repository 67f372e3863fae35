import { hash, verify } from "@node-rs/argon2";

/** argon2id with the parameters of RFC 9106 section 4, second recommended option, scaled to a web server. */
const PARAMETERS = { algorithm: 2, memoryCost: 19_456, timeCost: 2, parallelism: 1 } as const;

export const hashPassword = (password: string): Promise<string> => hash(password, PARAMETERS);

let decoy: Promise<string> | undefined;

/** Takes as long for a stranger as for somebody we know, so that time does not tell them apart. */
export async function passwordMatches(stored: string | undefined, password: string): Promise<boolean> {
  decoy ??= hashPassword("nobody's password");
  const matches = await verify(stored ?? (await decoy), password);
  return matches && stored !== undefined;
}
