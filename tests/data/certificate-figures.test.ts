import { beforeAll, describe, expect, test } from "vitest";
import { makeLab } from "../../seed/factories/lab";
import { release } from "../../seed/factories/steps";
import { roadRace } from "../../seed/factories/tolerance-classes";
import { type CertificateContent, getCertificate, getDataSheet } from "../../src/data/certificates";
import { type CycleFigures, evaluateCycle, judgeSet, resistanceAt20C } from "../../src/metrology";
import { asOwner } from "../support/databases";
import { cycleInputOf, madeTrue, type RawCycle, readRawCycle } from "../support/raw-cycle";
import { setInReview } from "../support/set-in-review";

type Recalculated = { raw: RawCycle; figures: CycleFigures; ohms: Map<string, number> };
type JsonSheet = { injectors: Record<string, string | number | null>[] };

let content: CertificateContent;
let csv: Record<string, string>[];
let json: JsonSheet;
let recalculated: Record<"asFound" | "asLeft", Recalculated>;

beforeAll(async () => {
  const lab = await makeLab();
  const { setId } = await setInReview(lab, { count: 6 });
  const { certificateId } = await release(lab.manager.context, setId);
  const customer = lab.customerPerson.context;
  content = (await getCertificate(customer, { certificateId })).content;
  csv = rowsOf((await getDataSheet(customer, { certificateId, format: "csv" })).text);
  json = JSON.parse((await getDataSheet(customer, { certificateId, format: "json" })).text);
  const { asFoundId, asLeftId } = await asOwner(async (sql) => {
    const [row] = await sql<{ asFoundId: string; asLeftId: string }[]>`
      select as_found_revision_id as "asFoundId", as_left_revision_id as "asLeftId" from certificates`;
    return row!;
  });
  recalculated = { asFound: await recalculate(asFoundId), asLeft: await recalculate(asLeftId) };
});

async function recalculate(revisionId: string): Promise<Recalculated> {
  const raw = await readRawCycle(revisionId);
  // n-heptane at 20 °C: Span and Wagner, Int. J. Thermophys. 24 (2003) 41.
  const figures = evaluateCycle(cycleInputOf(raw, { pressureKpa: 300, densityGPerMl: 0.683815 }));
  const { gain } = raw.instruments.find(({ kind }) => kind === "ohmmeter")!;
  const ohms = raw.windings.map(({ setInjectorId, windingOhm, leadOhm, windingTemperatureC }) => {
    const temperature = madeTrue(raw, "thermometer", windingTemperatureC).value;
    return [setInjectorId, resistanceAt20C(gain * (windingOhm - leadOhm), temperature)] as const;
  });
  return { raw, figures, ohms: new Map(ohms) };
}

function rowsOf(text: string): Record<string, string>[] {
  const [head, ...lines] = text.trimEnd().split("\r\n");
  const names = head!.split(",");
  return lines.map((line) =>
    Object.fromEntries(line.split(",").map((cell, column) => [names[column], cell])),
  );
}

describe.each(["asFound", "asLeft"] as const)("%s", (key) => {
  const phase = key === "asFound" ? "as found" : "as left";

  test("flows, lines, dead times, static flows and spreads are those of the readings in the tables", () => {
    expect(unnamed(content[key].figures)).toEqual(unnamed(recalculated[key].figures));
  });

  test("columns carry the names of the widths that were set", () => {
    const set = new Set(recalculated[key].raw.readings.flatMap(({ pulseWidthMs }) => pulseWidthMs ?? []));
    expect(content[key].figures.widths.map(({ pulseWidthMs }) => pulseWidthMs)).toEqual(
      [...set].sort((a, b) => a - b),
    );
  });

  test("resistances at 20 °C are those of the readings in the tables", () => {
    for (const { injectorId, resistance } of content[key].checks)
      expect(resistance!.ohmsAt20C).toBeCloseTo(recalculated[key].ohms.get(injectorId)!, 12);
  });

  test("the verdict is that of the class on these figures", () => {
    const { raw, figures } = recalculated[key];
    const verdict = judgeSet({
      figures,
      toleranceClass: { name: "", spreadLimits: roadRace.limits, ...roadRace },
      resistances: content[key].checks.map(({ injectorId, resistance }) => ({ injectorId, ...resistance! })),
      leakages: raw.windings.map(({ setInjectorId, leakageMm3PerMin }) => ({
        injectorId: setInjectorId,
        mm3PerMin: leakageMm3PerMin,
      })),
      leakageLimit: content.toleranceClass.leakageLimitMm3PerMin,
    });
    const outcome = ({ criteria, ...whole }: typeof verdict) => ({
      ...whole,
      criteria: criteria.map(({ pulseWidthMs: _name, ...criterion }) => criterion),
    });
    expect(outcome(content[key].verdict)).toEqual(outcome(verdict));
  });

  test("CSV and JSON hold the same digits", () => {
    for (const { injectorId, tag } of content.injectors) {
      const expected = digitsOf(recalculated[key], injectorId);
      const row = csv.find((candidate) => candidate.injector === tag && candidate.phase === phase)!;
      expect(row, `${tag} ${phase} in the CSV`).toMatchObject(expected);
      const entry = json.injectors.find(
        (candidate) => candidate.injector === tag && candidate.phase === phase,
      )!;
      const numbers = Object.fromEntries(
        Object.entries(expected).map(([name, text]) => [name, Number(text)]),
      );
      expect(entry, `${tag} ${phase} in the JSON`).toMatchObject(numbers);
    }
  });
});

/** The certificate names widths as they were set, the arithmetic as they truly are. */
function unnamed(figures: CycleFigures) {
  const withoutWidth = <Entry extends { pulseWidthMs: number }>({ pulseWidthMs: _name, ...entry }: Entry) =>
    entry;
  return {
    ...figures,
    widths: figures.widths.map(withoutWidth),
    injectors: figures.injectors.map((injector) => ({
      ...injector,
      flows: injector.flows.map(withoutWidth),
    })),
  };
}

/** Digits as the certificate prints them: one decimal for mL/min, two for µL and Ω, three for ms. */
function digitsOf({ raw, figures, ohms }: Recalculated, injectorId: string): Record<string, string> {
  const { flows, flowLine, staticFlow, heldOpen } = figures.injectors.find(
    (injector) => injector.injectorId === injectorId,
  )!;
  const set = [...new Set(raw.readings.flatMap(({ pulseWidthMs }) => pulseWidthMs ?? []))];
  return {
    static_flow_ml_per_min: staticFlow!.value.toFixed(1),
    static_flow_expanded_uncertainty_ml_per_min: staticFlow!.expandedUncertainty.toFixed(1),
    held_open_ml_per_min: heldOpen!.mlPerMin.toFixed(1),
    dead_time_ms: flowLine!.deadTimeMs.toFixed(3),
    dead_time_low_ms: flowLine!.deadTimeInterval!.low.toFixed(3),
    dead_time_high_ms: flowLine!.deadTimeInterval!.high.toFixed(3),
    resistance_at_20_c_ohm: ohms.get(injectorId)!.toFixed(2),
    ...Object.fromEntries(
      set.map((width) => {
        const { value } = madeTrue(raw, "pulse timer", width);
        const flow = flows.find(({ pulseWidthMs }) => pulseWidthMs === value)!;
        return [`flow_at_${width}_ms_ul`, flow.volumePerPulseUl.toFixed(2)];
      }),
    ),
  };
}
