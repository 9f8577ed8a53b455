import type { CertifiedInjector } from "../../../documents/certificate/content";
import type { SetInjector } from "../../sets";

/** Every injector of the visit, rejected and replaced ones included: they stay on record. */
export function certifyInjectors(injectors: SetInjector[]): CertifiedInjector[] {
  return injectors.map(
    ({ setInjectorId, injectorId: _thing, rejection, earlierVisits: _visits, ...injector }) => ({
      injectorId: setInjectorId,
      ...injector,
      stateReason: rejection?.reason ?? null,
    }),
  );
}
