import { createCipheriv, createDecipheriv, hkdfSync, randomBytes } from 'node:crypto';

const algorithm = 'aes-256-gcm';
const ivBytes = 12;
const tagBytes = 16;

/**
 * Encrypts the secrets of authenticator apps with a key derived from the settings. Each is bound to its member: a row
 * copied to another member does not open.
 */
export function createSeal(pepper: string) {
  const key = Buffer.from(hkdfSync('sha256', pepper, '', 'lydite totp secrets', 32));
  return {
    close(memberId: string, secret: Uint8Array): Buffer {
      const iv = randomBytes(ivBytes);
      const cipher = createCipheriv(algorithm, key, iv, { authTagLength: tagBytes }).setAAD(Buffer.from(memberId));
      const sealed = Buffer.concat([cipher.update(secret), cipher.final()]);
      return Buffer.concat([iv, cipher.getAuthTag(), sealed]);
    },
    /** @throws Error when the bytes were sealed for another member or by another key */
    open(memberId: string, sealed: Buffer): Buffer {
      const iv = sealed.subarray(0, ivBytes);
      const decipher = createDecipheriv(algorithm, key, iv, { authTagLength: tagBytes })
        .setAAD(Buffer.from(memberId))
        .setAuthTag(sealed.subarray(ivBytes, ivBytes + tagBytes));
      return Buffer.concat([decipher.update(sealed.subarray(ivBytes + tagBytes)), decipher.final()]);
    },
  };
}
export type Seal = ReturnType<typeof createSeal>;
