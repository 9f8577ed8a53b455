import type { Model } from "@/data/models";
import { formatQuantity } from "@/format/format-number";
import type { ComboboxOption } from "@/ui/form/combobox-option";
import { searchAt } from "@/ui/form/search-at";

export const searchModels = searchAt("/api/data/models", modelOption);

export function modelOption(model: Model): ComboboxOption {
  const flow = formatQuantity(model.ratedFlowMlPerMin, "staticFlow");
  return {
    value: model.modelId,
    label: `${model.make} ${model.partNumber}`,
    note: `${flow}, ${model.impedanceBand}${model.confirmed ? "" : ", not confirmed yet"}`,
  };
}
