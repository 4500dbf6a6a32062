import { createCipheriv, createDecipheriv, createHmac, hkdfSync, randomBytes } from "node:crypto";

const keyOf = (secret: string, use: string) => Buffer.from(hkdfSync("sha256", secret, "loamless", use, 32));

/** Encrypts a short text with AES-256-GCM under a key derived from the secret, so that it may rest in the database. */
export function seal(secret: string, text: string): string {
  const iv = randomBytes(12);
  const cipher = createCipheriv("aes-256-gcm", keyOf(secret, "seal"), iv);
  const body = Buffer.concat([cipher.update(text, "utf8"), cipher.final()]);
  return Buffer.concat([iv, cipher.getAuthTag(), body]).toString("base64url");
}

/** Opens what `seal` closed; throws when it was altered or sealed under another secret. */
export function unseal(secret: string, sealed: string): string {
  const bytes = Buffer.from(sealed, "base64url");
  const decipher = createDecipheriv("aes-256-gcm", keyOf(secret, "seal"), bytes.subarray(0, 12));
  decipher.setAuthTag(bytes.subarray(12, 28));
  return Buffer.concat([decipher.update(bytes.subarray(28)), decipher.final()]).toString("utf8");
}

/** A keyed digest, so that what is stored cannot be guessed back without the secret. */
export const keyedHash = (secret: string, text: string): Buffer =>
  createHmac("sha256", keyOf(secret, "hash")).update(text).digest();
