import { Notice } from "../../../ui/feedback/notice";

/** What hurts at the bench, said where the hands are. */
export function BenchCautions() {
  return (
    <Notice kind="caution">
      Test fluid burns and its spray is a mist: ventilate, keep every ignition source away, protect eyes and
      skin. Relieve the rail's pressure before opening it. Use insulated leads, keep clear of the winding's
      kick, and never pierce insulation when probing. The fluid's safety data sheet, local codes and qualified
      people come first.
    </Notice>
  );
}
