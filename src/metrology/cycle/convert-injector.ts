import type { Conversion } from "./convert-conditions";
import { convertDynamic, convertHeldOpen, type OwnFlow, type PulseFlow } from "./convert-reading";
import type { CycleConditions, CycleInjector } from "./types";

/** All readings of one injector as flows at reference conditions, in the order given. */
export type InjectorFlows = { pulses: PulseFlow[]; held: OwnFlow[] };

/** @throws RangeError naming the part of a reading that cannot be computed with. */
export function convertInjector(
  { channel, readings }: CycleInjector,
  beside: { conditions: CycleConditions; conversion: Conversion },
): InjectorFlows {
  const flows: InjectorFlows = { pulses: [], held: [] };
  for (const reading of readings)
    if (reading.kind === "dynamic") flows.pulses.push(convertDynamic(reading, { ...beside, channel }));
    else flows.held.push(convertHeldOpen(reading, { ...beside, channel }));
  return flows;
}
