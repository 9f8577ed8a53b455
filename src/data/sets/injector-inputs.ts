import { injectorConditions } from "../../db/vocabulary";
import { choice, id, optionalText, reason, writeInput } from "../fields";

export const rejectInjectorInput = writeInput({ setInjectorId: id("injector"), reason: reason() });

/** What takes the place of a rejected injector; its serial may be unknown. */
export const replaceInjectorInput = writeInput({
  setInjectorId: id("injector"),
  serial: optionalText({ label: "Serial", longest: 60 }),
  marking: optionalText({ label: "Marking", longest: 60 }),
  condition: choice("Condition", injectorConditions),
  conditionNote: optionalText({ label: "Note on its condition", longest: 500, lines: "many" }),
});
