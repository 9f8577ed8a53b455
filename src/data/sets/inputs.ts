import { z } from "zod";
import { id } from "../fields";

export const getSetInput = z.object({ setId: id("set") });
