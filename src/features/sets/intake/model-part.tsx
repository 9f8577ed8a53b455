"use client";
import { useState } from "react";
import { Button } from "@/ui/form/button";
import { Combobox } from "@/ui/form/combobox";
import type { ComboboxOption } from "@/ui/form/combobox-option";
import { NewModelFields } from "./new-model-fields";
import { searchModels } from "./search-models";

type Props = { initial: ComboboxOption | null; onModel: (modelId: string) => void };

/** The injector model: found by typing, or entered anew on the spot; the manager confirms it later. */
export function ModelPart({ initial, onModel }: Props) {
  const [newName, setNewName] = useState<string | null>(null);

  function leaveKnown(typed: string) {
    setNewName(typed);
    onModel("");
  }

  if (newName === null)
    return (
      <>
        <input type="hidden" name="model.is" value="known" readOnly />
        <Combobox
          name="model.modelId"
          label="Injector model"
          placeholder="Make or part number"
          search={searchModels}
          initial={initial}
          onChoose={(option) => onModel(option?.value ?? "")}
          onCreate={leaveKnown}
          createLabel={(typed) => `New model “${typed}”`}
        />
      </>
    );
  return (
    <fieldset>
      <legend className="mb-1 flex w-full items-baseline justify-between gap-2 text-heading font-semibold">
        New injector model
        <Button kind="quiet" size="small" onClick={() => setNewName(null)}>
          Choose a known one instead
        </Button>
      </legend>
      <input type="hidden" name="model.is" value="new" readOnly />
      <NewModelFields typed={newName} />
    </fieldset>
  );
}
