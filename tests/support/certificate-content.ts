import { createHash } from "node:crypto";
import type {
  CertificateContent,
  CertifiedInjector,
  CertifiedPhase,
} from "../../src/documents/certificate/content";
import {
  describeMethod,
  standingCautions,
  standingStatements,
} from "../../src/documents/certificate/wording";
import {
  evaluateCycle,
  type FlowLine,
  fuelErrorCurve,
  judgeSet,
  shortPulseTable,
  type ToleranceClass,
} from "../../src/metrology";

export type ContentOptions = {
  injectors?: number;
  widths?: number;
  paperSize?: "A4" | "Letter";
  /** Adds a rejected injector and the one that took its place. */
  replacement?: boolean;
  photos?: readonly { sha256: string; place: number }[];
};

const allWidths = [1.5, 2, 3, 4, 6, 8, 10, 12, 5, 7, 2.5, 1.75, 9, 14];
const reference = { pressureKpa: 300, densityGPerMl: 0.6838, fluid: "n-heptane at 20 °C" };
const model = {
  make: "Kestrel",
  partNumber: "KX-440",
  impedanceBand: "high impedance",
  resistanceLowOhm: 11,
  resistanceHighOhm: 13,
  ratedFlowMlPerMin: 440,
  ratedFlowBandPercent: 5,
  ratedPressureKpa: 300,
  leakageLimitMm3PerMin: 3,
  leakagePressureKpa: 300,
  sprayType: "cone",
};
const toleranceClass: ToleranceClass & { revision: number; leakageLimitMm3PerMin: number } = {
  name: "Road race",
  revision: 3,
  spreadLimits: [
    { fromPulseWidthMs: 1.5, spreadPercent: 3 },
    { fromPulseWidthMs: 2, spreadPercent: 2 },
  ],
  staticSpreadPercent: 3,
  deadTimeRangeMs: 0.03,
  resistanceRangeOhm: 0.5,
  leakageLimitMm3PerMin: 3,
};

/** An invented set of injectors, measured by nobody: figures follow from synthetic readings by the product's own arithmetic. */
export function certificateContent(options: ContentOptions = {}): CertificateContent {
  const { injectors: count = 8, paperSize = "A4", replacement = false, photos = [] } = options;
  const widths = allWidths.slice(0, options.widths ?? 7).sort((one, other) => one - other);
  const injectors = makeInjectors(count, replacement);
  const recorded = {
    reference,
    asFound: makePhase(
      injectors.filter(({ tag }) => !tag.endsWith("B")),
      widths,
      "as found",
    ),
    asLeft: makePhase(
      injectors.filter(({ state }) => state === "in set"),
      widths,
      "as left",
    ),
  };
  return {
    format: 1,
    paperSize,
    certificate: {
      number: "C26-0087/1",
      revision: 1,
      issuedAt: "2026-12-01T14:12:40.000Z",
      replaces: null,
      verificationCode: "7F3K-20QX-M9TD-HV5B",
      verificationUrl: null,
      recordSha256: createHash("sha256").update("newest entry").digest("hex"),
      programVersion: "Evenrail 0.1.0",
    },
    lab: {
      name: "Harrowgate Bench Works",
      address: "4 Quay Lane, Saltmarsh",
      phone: "+00 5550 1470",
      email: "bench@harrowgate.example",
      timeZone: "Europe/Berlin",
      accreditation: "",
      wording: "",
      placeOfWork: "Harrowgate Bench Works, room 2",
    },
    customer: { name: "Orrin Engine Works", contactName: "Tam Orrin", address: "11 Mill Row, Tern" },
    suppliedByCustomer: [
      { label: "Request", text: "Idle hunts since winter. Please keep the order of the rail." },
    ],
    set: {
      number: "26-0147",
      workAsked: ["clean", "flow test", "match"],
      receivedAt: "2026-11-24T08:12:00.000Z",
    },
    model,
    injectors,
    toleranceClass,
    ...recorded,
    cleaningRuns: [
      {
        recordedAt: "2026-11-27T09:40:00.000Z",
        recordedBy: "Ines Fallow",
        bath: "Bath 1",
        detergentBatch: "D-2611",
        minutes: 30,
        temperatureC: 55,
        backFlushed: true,
        partsRenewed: ["inlet filter", "upper seal"],
      },
    ],
    photos: photos.map(({ sha256, place }) => ({
      sha256,
      injectorId: injectors[place - 1]!.injectorId,
      phase: "as left" as const,
      takenAt: "2026-11-30T10:05:00.000Z",
    })),
    method: describeMethod(recorded),
    deviations: ["Recorded as read as found: 26-0147/4 at 3 ms lies 1.4 % off its line."],
    remarks: "",
    externallyProvided: [],
    statements: standingStatements(recorded),
    cautions: standingCautions(),
    testedBy: [
      {
        name: "Ines Fallow",
        role: "bench technician",
        at: "2026-11-25T10:12:00.000Z",
        meaning: "measured as found",
      },
      {
        name: "Ines Fallow",
        role: "bench technician",
        at: "2026-11-30T11:02:00.000Z",
        meaning: "measured as left",
      },
    ],
    releasedBy: {
      name: "Mara Quill",
      role: "lab manager",
      at: "2026-12-01T14:12:40.000Z",
      meaning: "reviewed the results and released this certificate",
    },
    onePersonTestedAndReleased: false,
  };
}

function makeInjectors(count: number, replacement: boolean): CertifiedInjector[] {
  const injectors = Array.from(
    { length: count },
    (_, index): CertifiedInjector => ({
      injectorId: `injector-${index + 1}`,
      position: index + 1,
      tag: `26-0147/${index + 1}`,
      serial: `K4-${1183 + 4 * index}`,
      marking: index % 3 === 0 ? `cyl ${index + 1}` : "",
      condition: index === 2 ? "dirty" : "sound",
      conditionNote: index === 2 ? "varnish at the tip" : "",
      state: "in set",
      stateReason: null,
      replacesTag: null,
    }),
  );
  if (!replacement) return injectors;
  const bad = injectors[Math.min(3, count - 1)]!;
  const better = {
    ...bad,
    injectorId: "injector-b",
    tag: `${bad.tag}B`,
    serial: "K4-2201",
    replacesTag: bad.tag,
  };
  bad.state = "replaced";
  bad.stateReason = "does not close below 12 V";
  return [...injectors, better].sort((one, other) => one.position - other.position);
}

function makePhase(
  injectors: readonly CertifiedInjector[],
  widths: readonly number[],
  phase: "as found" | "as left",
): CertifiedPhase {
  const random = seeded(phase === "as found" ? 11 : 29);
  const scatter = phase === "as found" ? 0.035 : 0.003;
  const pulseCount = 2000;
  const figures = evaluateCycle(
    {
      conditions: {
        fluid: "n-heptane",
        fluidTemperatureC: 22.4,
        pressureKpa: 300.4,
        driveVolts: 14,
        driverKind: "saturated",
        periodMs: 20,
        collects: "volume",
        shared: { pressureKpa: 0.3, fluidTemperatureC: 0.1, pulseWidthMs: 0.0005 },
        repeatability: 0.05,
      },
      reference,
      injectors: injectors.map(({ injectorId }) => {
        const flow = 440 * (1 + scatter * (2 * random() - 1));
        const deadTime = 0.94 + (phase === "as found" ? 0.012 : 0.004) * (2 * random() - 1);
        const volumeUl = (width: number) =>
          (flow / 60) * (width - deadTime) * (1 - 0.09 * Math.exp(-(width - deadTime) / 0.25));
        return {
          injectorId,
          channel: {
            division: 0.5,
            calibration: { gain: 1.0008, offset: -0.02, gainU: 0.0006, offsetU: 0.05 },
          },
          readings: [
            ...widths.map((pulseWidthMs) => ({
              kind: "dynamic" as const,
              pulseWidthMs,
              pulseCount,
              amount: rounded((volumeUl(pulseWidthMs) * pulseCount) / 1000 + 0.08 * (random() - 0.5), 0.1),
            })),
            { kind: "held open" as const, openSeconds: 20, amount: rounded((flow * 20) / 60, 0.1) },
          ],
        };
      }),
    },
    { draws: 500 },
  );
  const resistances = injectors.map(({ injectorId }) => ({
    injectorId,
    ohmsAt20C: 12.1 + 0.2 * (2 * random() - 1),
    expandedUncertainty: 0.06,
  }));
  const leakages = injectors.map(({ injectorId }) => ({
    injectorId,
    mm3PerMin: rounded((phase === "as found" ? 3.4 : 1.2) * random(), 0.1),
  }));
  return {
    measuredAt: phase === "as found" ? "2026-11-25T10:12:00.000Z" : "2026-11-30T11:02:00.000Z",
    cycleNumber: 1,
    revision: 1,
    bench: { code: "B2", location: "room 2" },
    fluid: "n-heptane",
    fluidTemperatureC: { value: 22.4, standardUncertainty: 0.1 },
    pressureKpa: { value: 300.4, standardUncertainty: 0.3 },
    driveVolts: { value: 14, standardUncertainty: 0.02 },
    periodMs: { value: 20, standardUncertainty: 0.0005 },
    driverKind: "saturated",
    collects: "volume",
    widths: widths.map((pulseWidthMs) => ({ pulseWidthMs, pulseCount, repeats: 1 })),
    heldOpenSeconds: 20,
    figures,
    verdict: judgeSet({ figures, toleranceClass, resistances, leakages, leakageLimit: 3 }),
    checks: injectors.map(({ injectorId }, index) => ({
      injectorId,
      channelNumber: (index % 8) + 1,
      load: Math.floor(index / 8) + 1,
      resistance: { ...resistances[index]!, bandVerdict: "pass" as const },
      insulationMegohm: 250,
      leakage: { mm3PerMin: leakages[index]!.mm3PerMin, pressureKpa: 300, seconds: 60 },
      sprayGrade: phase === "as found" ? "acceptable" : "good",
      note: "",
    })),
    fuelError: fuelErrorOf(figures.injectors, widths),
    shortPulseAdders: figures.injectors.flatMap(({ injectorId, flowLine }) =>
      flowLine ? shortPulseTable(flowLine).map((entry) => ({ injectorId, ...entry })) : [],
    ),
    deadTimesByVoltage: figures.injectors.flatMap(({ injectorId, flowLine }) =>
      flowLine
        ? [{ injectorId, volts: 14, deadTimeMs: flowLine.deadTimeMs, deadTimeSeMs: flowLine.deadTimeSeMs }]
        : [],
    ),
    calibrations: calibrationsOf(injectors.length),
    note: "",
  };
}

function fuelErrorOf(
  injectors: readonly { injectorId: string; flowLine: FlowLine | null }[],
  widths: readonly number[],
): CertifiedPhase["fuelError"] {
  const known = injectors.flatMap(({ injectorId, flowLine }) => (flowLine ? [{ injectorId, flowLine }] : []));
  if (known.length < 2) return { pulseWidthsMs: [], injectors: [] };
  const [from, to] = [widths[0]!, widths.at(-1)!];
  const pulseWidthsMs = Array.from({ length: 33 }, (_, step) => from * (to / from) ** (step / 32));
  const curve = fuelErrorCurve(
    known.map(({ flowLine }) => flowLine),
    pulseWidthsMs,
  );
  return {
    pulseWidthsMs,
    injectors: known.map(({ injectorId }, index) => ({
      injectorId,
      errorPercent: curve.map(({ errorsPercent }) => errorsPercent[index]!),
    })),
  };
}

function calibrationsOf(injectors: number): CertifiedPhase["calibrations"] {
  const period = { validFrom: "2026-03-14T00:00:00.000Z", validUntil: "2027-03-14T00:00:00.000Z" };
  const channels = Array.from({ length: Math.min(8, injectors) }, (_, index) => ({
    instrumentCode: `B2-C${index + 1}`,
    kind: "cylinder",
    channelNumber: index + 1,
    reference: `CAL 26-031${index}`,
    ...period,
  }));
  const others = ["pressure gauge", "thermometer", "ohmmeter", "pulse timer"].map((kind, index) => ({
    instrumentCode: `B2-${kind[0]!.toUpperCase()}1`,
    kind,
    channelNumber: null,
    reference: `CAL 26-040${index}`,
    ...period,
  }));
  return [...channels, ...others];
}

function rounded(value: number, step: number): number {
  return Number((Math.round(value / step) * step).toFixed(3));
}

/** Numbers from 0 to 1, the same for the same seed: the Park and Miller generator. */
function seeded(seed: number): () => number {
  let state = seed;
  return () => {
    state = (state * 48271) % 2147483647;
    return state / 2147483647;
  };
}
