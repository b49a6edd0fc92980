import { describe, expect, test } from "vitest";
import { Email, NewPassword } from "@/lib/core/contract/account";
import { Roles } from "@/lib/core/contract/people";

describe("an e-mail address", () => {
  test("is kept in lower case, without blanks around it", () => {
    expect(Email.parse("  Ada@Example.TEST ")).toBe("ada@example.test");
  });

  test.each([
    "a@x.test\r\nBcc: b@x.test",
    '"a b"@x.test',
    "ada@bücher.test",
    "ada＠x.test",
    "a,b@x.test",
    "<a@x.test>",
    "ada",
    "ada@",
    `${"a".repeat(250)}@x.test`,
  ])("that could do harm in a mail's header, or is none, is refused: %j", (given) => expect(Email.safeParse(given).success).toBe(false));
});

describe("a password", () => {
  test.each(["three wet oars", "          a b c d", "日本のヨットで行く海", "x".repeat(50) + "yzw", "correct horse battery stapler"])(
    "is taken: %j",
    (given) => expect(NewPassword.safeParse(given).success).toBe(true),
  );

  test.each([
    "short",
    "123456789",
    "1234567890",
    "Password123",
    "PASSWORD-123!",
    "aaaaaaaaaaaa",
    "abababababab",
    "correct horse battery staple",
    "x".repeat(201),
  ])("that is short, or guessed early, is refused: %j", (given) => expect(NewPassword.safeParse(given).success).toBe(false));
});

test("roles are a set: each once, at least one, only those there are", () => {
  expect(Roles.parse(["owner", "skipper", "owner"])).toEqual(["skipper", "owner"]);
  expect(Roles.safeParse([]).success).toBe(false);
  expect(Roles.safeParse(["admin"]).success).toBe(false);
});
