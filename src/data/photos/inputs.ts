import { z } from "zod";
import { phases, photoKinds } from "../../db/vocabulary";
import { choice, id, reason, writeInput } from "../fields";

export const mostPhotoBytes = 25 * 1024 * 1024;
export const mostPhotosPerSet = 60;
export const mostPhotosPerDay = 300;

/** A query says nothing by an empty value. */
const emptyIsMissing = (value: unknown) => (value === "" || value === null ? undefined : value);

/** All but the bytes, which only the server looks at. */
export const photoFields = {
  setId: id("set"),
  /** Missing when the photo shows the set as a whole. */
  setInjectorId: z.preprocess(emptyIsMissing, id("injector").optional()),
  kind: choice("Kind of photo", photoKinds),
  phase: z.preprocess(emptyIsMissing, choice("Phase", phases).optional()),
  /** The file's name on the sender's device: a label, never a path. */
  name: z.string().max(2000).catch(""),
};

export const photoSizes = ["full", "thumbnail"] as const;
export const getPhotoFileInput = z.object({
  photoId: id("photo"),
  size: z.enum(photoSizes).catch("full"),
});
export const hidePhotoInput = writeInput({ photoId: id("photo"), reason: reason() });
