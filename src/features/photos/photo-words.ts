import type { SetDetail, SetPhoto } from "@/data/sets";

/** What a photo shows, in a line. */
export function photoWords(photo: SetPhoto, injectors: SetDetail["injectors"]): string {
  const injector = injectors.find(({ setInjectorId }) => setInjectorId === photo.setInjectorId);
  const shows = injector ? injector.tag : "the set";
  return photo.kind === "spray" ? `${shows}, spray ${photo.phase}` : `${shows}, as it came in`;
}
