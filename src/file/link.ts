/** Bytes as text that may stand in a link's fragment (base64url without padding, RFC 4648 section 5), and back. */
import type { Result } from "../solver/index.ts";
import { limits } from "./limits.ts";

const letters = "ABCDEFGHIJKLMNOPQRSTUVWXYZabcdefghijklmnopqrstuvwxyz0123456789-_";

export function toLinkText(bytes: Uint8Array): string {
  let text = "";
  for (let i = 0; i < bytes.length; i += 3) {
    const three = (bytes[i]! << 16) | ((bytes[i + 1] ?? 0) << 8) | (bytes[i + 2] ?? 0);
    const letterCount = Math.min(3, bytes.length - i) + 1;
    for (let k = 0; k < letterCount; k += 1) text += letters[(three >> (18 - 6 * k)) & 63];
  }
  return text;
}

export function fromLinkText(text: string): Result<Uint8Array> {
  const length = Math.floor((text.length * 3) / 4);
  const broken = text.length > limits.size || text.length % 4 === 1 || !/^[\w-]*$/.test(text);
  if (broken) {
    const cure = "Copy the whole link again, or ask for the file.";
    return { ok: false, error: { where: "the link", why: "It is cut off or holds letters that no link has.", cure } };
  }
  const bytes = new Uint8Array(length);
  let bits = 0;
  let held = 0;
  let at = 0;
  for (const letter of text) {
    bits = ((bits << 6) | letters.indexOf(letter)) & 0xffffff;
    held += 6;
    if (held >= 8) {
      held -= 8;
      bytes[at] = (bits >> held) & 0xff;
      at += 1;
    }
  }
  return { ok: true, value: bytes };
}
