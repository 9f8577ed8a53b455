import { z } from "zod";

export const signInInput = z.object({
  email: z
    .string({ error: "E-mail is missing." })
    .trim()
    .min(1, "E-mail is missing.")
    .max(254, "E-mail has at most 254 characters."),
  password: z
    .string({ error: "Password is missing." })
    .min(1, "Password is missing.")
    .max(1000, "Password has at most 1000 characters."),
  next: z.string().max(2000).catch(""),
});

export const welcomeInput = z.object({
  token: z.string().min(20).max(100),
  password: z
    .string({ error: "Password is missing." })
    .min(1, "Password is missing.")
    .max(4000, "Password has at most 1000 characters."),
});
