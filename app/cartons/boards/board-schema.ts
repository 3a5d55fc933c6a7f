// Boards as they are stored and brought in from files: parsed both ways.
import { z } from "zod";
import type { AllowanceCard, Board } from "./board";

const text = z.string().max(400);
const mm = z.number().positive().max(50);
const twoWays = z.object({ alongGrain: z.number().min(0).max(50), acrossGrain: z.number().min(0).max(50) });
const colour = z.string().regex(/^#[0-9A-Fa-f]{6}$/, "A colour is # and six hexadecimal digits, like #FFFDF8.");

export const allowanceCardSchema = z.object({
  id: text.min(1), origin: z.enum(["handbook", "measured"]), process: z.enum(["rule-and-matrix", "crease-wheel", "laser-score", "press-brake"]),
  a90: twoWays, g180: twoWays, e180: twoWays, slide: mm, crushed: mm, tolerance: z.object({ crease: mm, cut: mm, caliper: mm }), note: text, source: text,
});

export const boardSchema = z.object({
  id: text.min(1), revision: z.number().int().positive(), name: text.min(1), family: z.enum(["carton", "micro"]), grade: text, plainGrade: text,
  grammage: z.number().min(100).max(3000), caliper: z.number().min(0.1).max(10), caliperTolerance: mm, caliperMethod: z.enum(["ISO 534", "ISO 3034"]),
  flute: z.object({ letter: z.enum(["E", "F", "N", "G"]), height: mm, pitch: mm }).nullable(), front: text, back: text,
  colour: z.object({ front: colour, back: colour, core: colour }), card: allowanceCardSchema, source: text,
});

/** Both ways, so that schema and type cannot drift apart: a difference does not compile. */
export const asBoard = (parsed: z.infer<typeof boardSchema>): Board => parsed;
export const asParsedBoard = (board: Board): z.infer<typeof boardSchema> => board;
export const asCard = (parsed: z.infer<typeof allowanceCardSchema>): AllowanceCard => parsed;
