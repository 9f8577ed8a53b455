import type { Model } from "@/data/models";
import { formatQuantity } from "@/format/format-number";
import type { ComboboxOption } from "@/ui/form/combobox-option";

export async function searchModels(query: string): Promise<ComboboxOption[]> {
  const response = await fetch(`/api/data/models?search=${encodeURIComponent(query)}`);
  if (!response.ok) throw new Error(`The search for models answered ${response.status}`);
  const found: Model[] = await response.json();
  return found.map(modelOption);
}

export function modelOption(model: Model): ComboboxOption {
  const flow = formatQuantity(model.ratedFlowMlPerMin, "staticFlow");
  return {
    value: model.modelId,
    label: `${model.make} ${model.partNumber}`,
    note: `${flow}, ${model.impedanceBand}${model.confirmed ? "" : ", not confirmed yet"}`,
  };
}
