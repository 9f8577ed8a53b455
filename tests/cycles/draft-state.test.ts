import fc from "fast-check";
import { describe, expect, test } from "vitest";
import type { DraftFields } from "../../src/data/cycles/draft-fields";
import { mergeChanges } from "../../src/data/cycles/sheet/merge-changes";
import {
  chooseText,
  type DraftState,
  openState,
  othersChanged,
  saved,
  sendTyped,
  sentBack,
  shownFields,
  typeInto,
} from "../../src/features/cycles/draft/draft-state";

const pressure = "conditions.pressureKpa";
const note = "note";

function typed(state: DraftState, field: string, value: string) {
  return typeInto(state, [{ field, value }]);
}

describe("one technician", () => {
  test("what is typed shows at once and is sent with the text it was typed over", () => {
    const state = sendTyped(typed(openState(1, { [note]: "a" }), note, "b"), "key");
    expect(shownFields(state)[note]).toBe("b");
    expect(state.inFlight?.changes).toEqual([{ field: note, base: "a", value: "b" }]);
  });

  test("typing back to what stood there leaves nothing to send", () => {
    const state = typed(typed(openState(1, { [note]: "a" }), note, "b"), note, "a");
    expect(sendTyped(state, "key").inFlight).toBeNull();
  });

  test("a text typed while another is on its way is based on that one", () => {
    const sending = sendTyped(typed(openState(1, {}), note, "a"), "key");
    const state = saved(typed(sending, note, "ab"), { version: 2, fields: null });
    expect(state.stored[note]).toBe("a");
    expect(state.typed[note]).toEqual({ base: "a", value: "ab" });
  });
});

describe("two technicians", () => {
  test("different fields go together without a word", () => {
    const mine = sendTyped(typed(openState(1, {}), note, "mine"), "key");
    const state = saved(mine, { version: 3, fields: { [note]: "mine", [pressure]: "300" } });
    expect(shownFields(state)).toEqual({ [note]: "mine", [pressure]: "300" });
    expect(state.conflicts).toEqual({});
  });

  test("the same field is a conflict that shows both texts, and the rest is sent again", () => {
    const mine = typed(typed(openState(1, {}), pressure, "300"), note, "mine");
    const state = sentBack(sendTyped(mine, "key"), [{ field: pressure, theirs: "301", yours: "300" }]);
    expect(state.conflicts).toEqual({ [pressure]: { field: pressure, theirs: "301", yours: "300" } });
    expect(sendTyped(state, "next").inFlight?.changes).toEqual([{ field: note, base: "", value: "mine" }]);
  });

  test("theirs is taken, or mine is sent over theirs", () => {
    const mine = sendTyped(typed(openState(1, {}), pressure, "300"), "key");
    const state = sentBack(mine, [{ field: pressure, theirs: "301", yours: "300" }]);
    expect(shownFields(chooseText(state, pressure, "theirs"))[pressure]).toBe("301");
    const kept = sendTyped(chooseText(state, pressure, "yours"), "next");
    expect(kept.inFlight?.changes).toEqual([{ field: pressure, base: "301", value: "300" }]);
  });

  test("a poll shows their text in the field that I am typing in as a conflict", () => {
    const mine = typed(openState(1, {}), pressure, "300");
    const state = othersChanged(mine, { version: 2, fields: { [pressure]: "301" } });
    expect(state.conflicts[pressure]).toEqual({ field: pressure, theirs: "301", yours: "300" });
  });

  test("the same text typed by both is no conflict", () => {
    const mine = typed(openState(1, {}), pressure, "300");
    const state = othersChanged(mine, { version: 2, fields: { [pressure]: "300" } });
    expect(state.conflicts).toEqual({});
    expect(state.typed).toEqual({});
  });
});

test("whatever two people type in whatever order, no text is overwritten unseen", () => {
  const step = fc.record({
    who: fc.constantFrom(0, 1),
    act: fc.constantFrom("type", "send", "poll"),
    field: fc.constantFrom("note", "repeats", pressure),
    value: fc.constantFrom("1", "2", "3"),
  });
  fc.assert(
    fc.property(fc.array(step, { maxLength: 40 }), (steps) => {
      let server: { version: number; fields: DraftFields } = { version: 1, fields: {} };
      const people = [openState(1, {}), openState(1, {})];
      for (const { who, act, field, value } of steps) {
        const before = people[who]!;
        if (act === "type") people[who] = typed(before, field, value);
        if (act === "poll") people[who] = othersChanged(before, server);
        if (act !== "send") continue;
        const sending = sendTyped(before, "key");
        if (!sending.inFlight) continue;
        const merged = mergeChanges(server.fields, sending.inFlight.changes);
        if (merged.conflicts.length > 0) {
          people[who] = sentBack(sending, merged.conflicts);
          continue;
        }
        for (const change of merged.changed) expect(server.fields[change.field] ?? "").toBe(change.base);
        server = { version: server.version + 1, fields: merged.fields };
        people[who] = saved(sending, server);
        expect(shownFields(people[who]!)).toMatchObject(
          Object.fromEntries(sending.inFlight.changes.map((change) => [change.field, change.value])),
        );
      }
    }),
  );
});
