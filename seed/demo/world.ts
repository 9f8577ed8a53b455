import type { DemoBench } from "./benches";
import type { describeLab } from "./lab";
import type { Staff } from "./people";

/** Everything that a set of the demo meets on its course. */
export type World = {
  /** The day on which the demo is made. */
  now: Date;
  staff: Staff;
  customers: string[];
  benches: DemoBench[];
} & Awaited<ReturnType<typeof describeLab>>;
