import { z } from 'zod';

/**
 * True for one bare address that mail can be sent to: no name, no line break, local part at most 64 and
 * the whole at most 254 characters (RFC 5321, 4.5.3.1; the path of 256 counts its angle brackets).
 */
export function isMailAddress(text: string): boolean {
  return text.length <= 254 && text.lastIndexOf('@') <= 64 && z.email().safeParse(text).success;
}

export interface Sender {
  readonly name: string;
  readonly address: string;
}

/** Reads `Name <address>` or a bare address; throws when there is no usable address in it. */
export function readSender(text: string): Sender {
  const match = /^(.*)<([^<>]+)>\s*$/.exec(text);
  const address = (match?.[2] ?? text).trim();
  if (!isMailAddress(address)) {
    throw new Error(`MAIL_FROM is "${text}": write Name <address> with a usable address.`);
  }
  return { name: (match?.[1] ?? '').trim().replace(/^"(.*)"$/, '$1'), address };
}
