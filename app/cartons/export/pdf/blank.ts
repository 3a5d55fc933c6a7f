// The carton's layers on a page, each in its own group and separation.
import type { Box, Path } from "../../geometry/outline";
import { boundsOf } from "../../geometry/path";
import type { LayerName, Layers } from "../../types";
import { plain } from "../number";
import { LAYER_ORDER, PROCESSING_STEPS } from "../processing-steps";
import { groupOf } from "./layer-groups";
import type { Ink } from "./ink";

/** Distance between the lines of a hatch, mm. */
const HATCH = 1.8;
const BLEED_TINT = 0.14;

export function drawLayers(ink: Ink, layers: Layers): void {
  for (const name of LAYER_ORDER) {
    const paths = layers[name].map((p) => p.path);
    if (paths.length === 0) continue;
    const step = PROCESSING_STEPS[name];
    ink.layer(groupOf(name).key, () => {
      if (name === "bleed") tintOutside(ink, paths, layers);
      if (name === "glue") for (const path of paths) hatch(ink, path, step.width);
      ink.raw("0 J 1 j");
      ink.stroke(step.width, step.dash);
      for (const path of paths) ink.paths([path], "S");
    });
  }
}

/** A pale tint between the cut and the edge of the bleed. */
function tintOutside(ink: Ink, bleed: readonly Path[], layers: Layers): void {
  const outlines = layers.cut.filter((p) => p.role === "outline").map((p) => p.path);
  const sheet = grown(boundsOf([...bleed, ...outlines]), 1);
  ink.apart(() => {
    ink.paths([rectangle(sheet), ...outlines], "W* n");
    ink.tint(BLEED_TINT);
    ink.paths(bleed, "f*");
  });
}

function hatch(ink: Ink, path: Path, width: number): void {
  const b = boundsOf([path]);
  const height = b.maxY - b.minY;
  ink.apart(() => {
    ink.paths([path], "W n");
    ink.stroke(width * 0.7);
    for (let x = b.minX - height; x < b.maxX; x += HATCH) ink.line({ x, y: b.minY }, { x: x + height, y: b.maxY });
  });
}

/** A layer's line or zone in process colours, for the legend. */
export function drawSample(ink: Ink, name: LayerName, box: Box): void {
  ink.apart(() => sample(ink, name, box));
}

function sample(ink: Ink, name: LayerName, box: Box): void {
  const step = PROCESSING_STEPS[name];
  const cmyk = step.cmyk.map(plain).join(" ");
  ink.raw(`${cmyk} K`);
  const middle = (box.minY + box.maxY) / 2;
  if (name === "bleed" || name === "glue" || name === "safe") {
    const path = rectangle(box);
    if (name === "bleed") {
      ink.raw(`${step.cmyk.map((c) => plain(c * BLEED_TINT)).join(" ")} k`);
      ink.paths([path], "f");
    }
    if (name === "glue") hatch(ink, path, step.width);
    ink.stroke(step.width, step.dash);
    ink.paths([path], "S");
    return;
  }
  ink.stroke(step.width, step.dash);
  ink.line({ x: box.minX, y: middle }, { x: box.maxX, y: middle });
}

const grown = (b: Box, by: number): Box => ({ minX: b.minX - by, minY: b.minY - by, maxX: b.maxX + by, maxY: b.maxY + by });
const rectangle = (b: Box): Path => ({
  closed: true,
  vertices: [{ x: b.minX, y: b.minY, bulge: 0 }, { x: b.maxX, y: b.minY, bulge: 0 }, { x: b.maxX, y: b.maxY, bulge: 0 }, { x: b.minX, y: b.maxY, bulge: 0 }],
});
