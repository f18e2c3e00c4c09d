import fc from "fast-check";
import { expect, it } from "vitest";
import { fromLinkText, toLinkText } from "../../src/file/link.ts";

it("writes bytes as the platform's own base64url does, and reads them back", () => {
  fc.assert(
    fc.property(fc.uint8Array({ maxLength: 50 }), (bytes) => {
      const text = toLinkText(bytes);
      expect(text).toBe(Buffer.from(bytes).toString("base64url"));
      expect(fromLinkText(text)).toEqual({ ok: true, value: bytes });
    }),
  );
});

it.each(["a", "abcd=", "ab cd", "abc/", "ä"])("refuses what is no such text: %s", (text) => {
  expect(fromLinkText(text).ok).toBe(false);
});
