// The stored question, parsed on the way in and out.
import { z } from "zod";
import type { Brief } from "./types";

const name = z.string().min(1).max(80);
const value = z.union([z.number(), z.boolean(), z.string().max(80)]);

/** A figure may be absurd here: the core refuses it with a limit and a value that works. It must be a number. */
export const briefSchema = z.object({
  construction: name,
  size: z.object({ L: z.number(), W: z.number(), D: z.number() }),
  basis: z.enum(["inside", "crease", "outside", "product"]),
  room: z.number().min(0).max(500).default(1),
  board: name,
  options: z.record(name, value).default({}),
  typed: z.record(name, z.string().max(200)).default({}),
});

/** The compiler holds schema and type together. */
export const parseBrief = (input: unknown): Brief => briefSchema.parse(input);
