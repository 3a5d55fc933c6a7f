// Cartons as SVG in millimetres. Nothing is drawn here but the layers: dimensions and titles belong to the PDF.
import type { Box } from "../geometry/outline";
import { boundsOf, pathData, shifted } from "../geometry/path";
import type { Carton, LayerName } from "../types";
import { plain } from "./number";
import { LAYER_ORDER, PROCESSING_STEPS } from "./processing-steps";
import { layersSeen, seenBox, sideWords, type Side } from "./sheet-view";

export interface SvgOptions {
  readonly side: Side;
  readonly revision: string;
  /** Name of the carton; the construction's name when left out. */
  readonly title?: string;
  /** Layers to write; all of them when left out. */
  readonly layers?: readonly LayerName[];
}

const MARKUP: Readonly<Record<string, string>> = { "&": "&amp;", "<": "&lt;", ">": "&gt;", '"': "&quot;" };

const PLAIN = /^[ !#-%'-;=?-~]*$/;

/** Text fit for XML: mark-up escaped, characters that XML forbids left out. */
export const xmlText = (text: string): string => PLAIN.test(text) ? text : text.replace(/[\u0000-\u0008\u000B\u000C\u000E-\u001F\uFFFE\uFFFF]/g, "").replace(/[&<>"]/g, (c) => MARKUP[c]!);

/** To the nearest thousandth of a millimetre: the chords of the bleed do not push the cut off its round figures. */
function frameOf(b: Box): Box {
  const near = (value: number) => Math.round(value * 1000) / 1000;
  return { minX: near(b.minX), minY: near(b.minY), maxX: near(b.maxX), maxY: near(b.maxY) };
}

/**
 * The carton as an SVG document at true size: width and height in mm, one user unit a millimetre, y downwards, the
 * upper left corner of all layers at 0 0. One group a layer, named by its ISO 19593-1 step. The same input gives the
 * same bytes.
 */
export function svgOf(carton: Carton, options: SvgOptions): string {
  const layers = layersSeen(carton, options.side);
  const names = LAYER_ORDER.filter((name) => layers[name].length > 0 && (options.layers === undefined || options.layers.includes(name)));
  const paths = names.flatMap((name) => layers[name].map((p) => p.path));
  // Nothing to draw? Then the frame is the blank's own.
  const box = frameOf(paths.length > 0 ? boundsOf(paths) : seenBox(carton.blank.bounds, options.side));
  const width = plain(box.maxX - box.minX);
  const height = plain(box.maxY - box.minY);
  const title = xmlText(options.title ?? carton.construction.name);
  const words = `${sideWords(options.side)}, revision ${xmlText(options.revision)}, units mm, scale 1 : 1`;
  let text =
    `<?xml version="1.0" encoding="UTF-8"?>\n` +
    `<svg xmlns="http://www.w3.org/2000/svg" width="${width}mm" height="${height}mm" viewBox="0 0 ${width} ${height}" fill="none" stroke-linecap="butt" stroke-linejoin="round">\n` +
    `<title>${title}, ${words}</title>\n` +
    `<desc>Blank ${plain(carton.blank.width)} x ${plain(carton.blank.height)} mm, ${xmlText(carton.board.name)}. Calculated: cut and fold a sample before the run.</desc>\n` +
    `<metadata><carton xmlns="urn:cartonwright:carton" units="mm" scale="1" side="${options.side}" revision="${xmlText(options.revision)}" construction="${xmlText(carton.construction.id)}" origin-x="${plain(-box.minX)}" origin-y="${plain(box.maxY)}"/></metadata>\n`;
  for (const name of names) {
    const step = PROCESSING_STEPS[name];
    const dash = step.dash.length > 0 ? ` stroke-dasharray="${step.dash.map(plain).join(" ")}"` : "";
    text += `<g id="${step.type}" data-processing-group="${step.group}" data-processing-step="${step.type}" stroke="${step.rgb}" stroke-width="${plain(step.width)}"${dash}>\n<title>${step.label}</title>\n`;
    for (const { id, path } of layers[name]) text += `<path data-name="${xmlText(id)}" d="${pathData(shifted(path, -box.minX, 0), plain, box.maxY)}"/>\n`;
    text += "</g>\n";
  }
  return `${text}</svg>\n`;
}
