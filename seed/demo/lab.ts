import type { Context } from "../../src/data/access/actor";
import { addFluid, listFluids } from "../../src/data/fluids";
import { editLabDetails, getLabDetails } from "../../src/data/lab";
import { keyed } from "../factories/acting";
import { addSomeModel, kestrel } from "../factories/models";
import { addSomeClass } from "../factories/tolerance-classes";

/** Who the invented lab is, what it flows and which models and classes it knows. */
export async function describeLab(manager: Context) {
  const { testPlan, version, ...details } = await getLabDetails(manager);
  await editLabDetails(
    manager,
    keyed({
      ...details,
      version,
      widths: testPlan.widths,
      heldOpenSeconds: testPlan.heldOpenSeconds,
      name: "Halvard Injector Laboratory",
      address: "Quay Shed 4\n12 Lantern Wharf\nSkarne Harbour",
      phone: "+00 555 0147",
      email: "counter@halvard-lab.example",
    }),
  );
  const [heptane] = await listFluids(manager);
  // An invented blend: its figures are nobody's.
  await addFluid(
    manager,
    keyed({
      name: "Bench fluid M",
      densityAt15GPerMl: 0.774,
      expansionPerK: 0.00092,
      source: "Invented for the demo",
    }),
  );
  return {
    fluidId: heptane!.fluidId,
    models: await addModels(manager),
    classes: await addClasses(manager),
  };
}

export type DemoModel = { modelId: string; ratedFlowMlPerMin: number; ohms: number };

async function addModels(manager: Context): Promise<Record<string, DemoModel>> {
  const listed = [
    kestrel,
    { ...kestrel, partNumber: "KX-720", ratedFlowMlPerMin: 720 },
    {
      ...kestrel,
      make: "Wherrow",
      partNumber: "W-215",
      resistanceLowOhm: 13.8,
      resistanceHighOhm: 15.2,
      ratedFlowMlPerMin: 215,
    },
    {
      ...kestrel,
      make: "Wherrow",
      partNumber: "W-330 D",
      resistanceLowOhm: 13.8,
      resistanceHighOhm: 15.2,
      ratedFlowMlPerMin: 330,
      sprayType: "dual stream" as const,
    },
    {
      ...kestrel,
      make: "Obrey",
      partNumber: "OB-160",
      resistanceLowOhm: 11,
      resistanceHighOhm: 13,
      ratedFlowMlPerMin: 160,
      sprayType: "single stream" as const,
    },
  ];
  const added: Record<string, DemoModel> = {};
  for (const values of listed) {
    const modelId = await addSomeModel(manager, values);
    const ohms = (values.resistanceLowOhm + values.resistanceHighOhm) / 2;
    added[values.partNumber] = { modelId, ratedFlowMlPerMin: values.ratedFlowMlPerMin, ohms };
  }
  return added;
}

async function addClasses(manager: Context): Promise<Record<string, string>> {
  return {
    "Road race": await addSomeClass(manager),
    Street: await addSomeClass(manager, "Street", {
      staticSpreadPercent: 4,
      deadTimeRangeMs: 0.1,
      resistanceRangeOhm: 1,
      limits: [
        { fromPulseWidthMs: 0, spreadPercent: 9 },
        { fromPulseWidthMs: 3, spreadPercent: 5 },
      ],
    }),
  };
}
