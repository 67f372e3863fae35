import { createCipheriv, createDecipheriv, randomBytes } from "node:crypto";
import { env } from "@/lib/env";
import { AppError } from "@/lib/errors";

const CIPHER = "aes-256-gcm";
const NONCE_BYTES = 12;
const TAG_BYTES = 16;

/** Where a sealed text belongs: copied to another row or another company it does not open. */
type Place = { companyId: string; secretId: string };

const key = () => Buffer.from(env().SECRETS_KEY, "base64");
const bound = ({ companyId, secretId }: Place) => Buffer.from(`${companyId}/${secretId}`);

/** Nonce, tag and cipher text (NIST SP 800-38D), as one text. */
export function seal(text: string, place: Place): string {
  const nonce = randomBytes(NONCE_BYTES);
  const cipher = createCipheriv(CIPHER, key(), nonce, { authTagLength: TAG_BYTES }).setAAD(bound(place));
  const sealed = Buffer.concat([cipher.update(text, "utf8"), cipher.final()]);
  return Buffer.concat([nonce, cipher.getAuthTag(), sealed]).toString("base64");
}

export function unseal(sealed: string, place: Place): string {
  const bytes = Buffer.from(sealed, "base64");
  try {
    const nonce = bytes.subarray(0, NONCE_BYTES);
    const decipher = createDecipheriv(CIPHER, key(), nonce, { authTagLength: TAG_BYTES }).setAAD(bound(place));
    decipher.setAuthTag(bytes.subarray(NONCE_BYTES, NONCE_BYTES + TAG_BYTES));
    return decipher.update(bytes.subarray(NONCE_BYTES + TAG_BYTES), undefined, "utf8") + decipher.final("utf8");
  } catch {
    throw new AppError("blocked", "This code cannot be read: it was changed, or sealed under another key");
  }
}
