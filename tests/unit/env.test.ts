import { expect, test } from "vitest";
import { parseEnvironment } from "@/lib/env";

test("an empty environment is the demo on loopback with the sessions' default limits", () => {
  expect(parseEnvironment({})).toMatchObject({
    PORT: 3000,
    HOST: "127.0.0.1",
    DATABASE_URL: "file:./data/flitchbook.db",
    SESSION_IDLE_MINUTES: 60,
    SESSION_HOURS: 12,
  });
  expect(parseEnvironment({}).PUBLIC_ORIGIN).toBeUndefined();
});

test("blank variables count as missing", () => {
  expect(parseEnvironment({ PORT: " ", PUBLIC_ORIGIN: "" }).PORT).toBe(3000);
});

test.each([
  [{ PORT: "80000" }, "PORT"],
  [{ PORT: "3e3" }, "PORT"],
  [{ PUBLIC_ORIGIN: "book.example.com" }, "PUBLIC_ORIGIN"],
  [{ PUBLIC_ORIGIN: "https://book.example.com/path" }, "PUBLIC_ORIGIN"],
  [{ DATABASE_URL: "postgres://x" }, "DATABASE_URL"],
  [{ SESSION_HOURS: "-1" }, "SESSION_HOURS"],
])("%o is refused in one line that names the variable", (source, name) => {
  expect(() => parseEnvironment(source)).toThrow(new RegExp(`^Environment: ${name} [^\n]+$`));
});
