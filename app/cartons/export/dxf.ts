// The only importer of makerjs. Cartons as DXF: one layer a process, millimetres declared, outlines as polylines with bulges.
//
// Entities come from Maker.js. Header, tables and comments are written here, because Maker.js leaves out $ACADVER, the
// table counts and the base point of POLYLINE, which strict readers ask for. Each path goes in under a layer name of its
// own and gets its process's name back afterwards: Maker.js looks for chains within a layer, and a slit that ends on the
// outline would be taken for a branch of it.
import makerjs from "makerjs";
import type { Box, Path } from "../geometry/outline";
import { arcOf, boundsOf, eachEdge } from "../geometry/path";
import { SAME_POINT, SHORTEST_LINE } from "../geometry/tolerance";
import type { Carton, LayerName } from "../types";
import { plain } from "./number";
import { LAYER_ORDER, PROCESSING_STEPS } from "./processing-steps";
import { layersSeen, sideWords, type Side } from "./sheet-view";

export interface DxfOptions {
  readonly side: Side;
  readonly revision: string;
  readonly title?: string;
  readonly layers?: readonly LayerName[];
}

type Group = readonly [code: string, value: string];

interface Written {
  readonly layer: string;
  readonly path: Path;
}

const DEGREES = 180 / Math.PI;

function modelOf(path: Path, layer: string): makerjs.IModel {
  const paths: Record<string, makerjs.IPath> = {};
  eachEdge(path, (a, b, i) => {
    if (a.bulge === 0) {
      paths[`e${i}`] = new makerjs.paths.Line([a.x, a.y], [b.x, b.y]);
      return;
    }
    const { centre, radius, from, sweep } = arcOf(a, b);
    const start = (sweep > 0 ? from : from + sweep) * DEGREES;
    paths[`e${i}`] = new makerjs.paths.Arc([centre.x, centre.y], radius, start, start + Math.abs(sweep) * DEGREES);
  });
  return { layer, paths };
}

/**
 * The carton as a DXF text (R12, ASCII). Figures are mm to a millionth; x and y are those of the drawing seen from `side`.
 * Throws when an entity would be lost: that is a defect, not something to hide.
 */
export function dxfOf(carton: Carton, options: DxfOptions): string {
  const layers = layersSeen(carton, options.side);
  const names = LAYER_ORDER.filter((name) => layers[name].length > 0 && (options.layers === undefined || options.layers.includes(name)));
  const written: Written[] = names.flatMap((name) => layers[name].map(({ path }) => ({ layer: PROCESSING_STEPS[name].dxf.layer, path })));
  const models: Record<string, makerjs.IModel> = {};
  written.forEach(({ path }, i) => { models[`m${i}`] = modelOf(path, `p${i}`); });
  const text = makerjs.exporter.toDXF({ models }, { usePOLYLINE: true, units: makerjs.unitType.Millimeter, accuracy: SAME_POINT, pointMatchingDistance: SHORTEST_LINE });
  const entities = entitiesOf(text);
  refuseLoss(entities, written);
  const bounds = written.length > 0 ? boundsOf(written.map((w) => w.path)) : carton.blank.bounds;
  const groups: Group[] = [
    ...comments(carton, options),
    ...header(bounds),
    ...tables(names),
    ["0", "SECTION"], ["2", "ENTITIES"],
    ...entities.flatMap((entity) => renamed(entity, written)),
    ["0", "ENDSEC"], ["0", "EOF"],
  ];
  return `${groups.map(([code, value]) => `${code}\n${value}`).join("\n")}\n`;
}

/** The groups of each entity in a DXF text; a polyline holds its vertices and its end. */
function entitiesOf(text: string): Group[][] {
  const lines = text.split(/\r?\n/);
  const entities: Group[][] = [];
  let isInside = false;
  for (let i = 0; i + 1 < lines.length; i += 2) {
    const code = lines[i]!.trim();
    const value = lines[i + 1]!;
    if (code === "2" && value === "ENTITIES") isInside = true;
    else if (isInside && code === "0" && value === "ENDSEC") return entities;
    else if (isInside && code === "0" && value !== "VERTEX" && value !== "SEQEND") entities.push([[code, value]]);
    else if (isInside) entities[entities.length - 1]?.push([code, value]);
  }
  return entities;
}

const numberOf = (entity: readonly Group[]): number => Number(entity.find(([code]) => code === "8")?.[1].slice(1));

function refuseLoss(entities: readonly (readonly Group[])[], written: readonly Written[]): void {
  if (entities.length !== written.length) throw new Error(`DXF: ${written.length} paths gave ${entities.length} entities`);
  for (const entity of entities) {
    const path = written[numberOf(entity)]?.path;
    if (!path) throw new Error("DXF: an entity without a path");
    const isPolyline = entity[0]![1] === "POLYLINE";
    const vertices = entity.filter(([code, value]) => code === "0" && value === "VERTEX").length;
    const isClosed = entity.some(([code, value]) => code === "70" && value === "1");
    const isWhole = isPolyline ? vertices === path.vertices.length && isClosed === path.closed : path.vertices.length === 2 && !path.closed;
    if (!isWhole) throw new Error(`DXF: ${entity[0]![1]} with ${vertices} vertices for a path of ${path.vertices.length}`);
  }
}

function renamed(entity: readonly Group[], written: readonly Written[]): Group[] {
  const layer = written[numberOf(entity)]!.layer;
  return entity.flatMap(([code, value]): Group[] => {
    if (code === "8") return [["8", layer]];
    if (code === "6") return [];
    if (code === "66") return [["66", "1"], ["10", "0"], ["20", "0"], ["30", "0"]];
    if (code === "0" && value === "SEQEND") return [["0", "SEQEND"], ["8", layer]];
    return [[code, value]];
  });
}

/** Letters that do not come apart into a plain one and an accent. */
const LETTERS: Readonly<Record<string, string>> = { ß: "ss", ł: "l", Ł: "L", ø: "o", Ø: "O", æ: "ae", Æ: "AE", œ: "oe", Œ: "OE", đ: "d", Đ: "D", ı: "i", "–": "-", "—": "-", "×": "x" };

/** One line of printable ASCII: R12 knows no other text. */
const ascii = (text: string): string => text.replace(/./gu, (c) => LETTERS[c] ?? c).normalize("NFKD").replace(/[\u0300-\u036f]/g, "").replace(/[^\x20-\x7E]/g, "?");

const comments = (carton: Carton, options: DxfOptions): Group[] => [
  ["999", ascii(`${options.title ?? carton.construction.name}, revision ${options.revision}`)],
  ["999", `Units: millimetres. Scale 1 : 1. ${sideWords(options.side)[0]!.toUpperCase()}${sideWords(options.side).slice(1)}.`],
  ["999", ascii(`${carton.board.name}; blank ${plain(carton.blank.width)} x ${plain(carton.blank.height)} mm.`)],
  ["999", "Calculated: cut and fold a sample before the run."],
];

const header = (b: Box): Group[] => [
  ["0", "SECTION"], ["2", "HEADER"],
  ["9", "$ACADVER"], ["1", "AC1009"],
  ["9", "$INSUNITS"], ["70", "4"],
  ["9", "$MEASUREMENT"], ["70", "1"],
  ["9", "$EXTMIN"], ["10", plain(b.minX)], ["20", plain(b.minY)], ["30", "0"],
  ["9", "$EXTMAX"], ["10", plain(b.maxX)], ["20", plain(b.maxY)], ["30", "0"],
  ["0", "ENDSEC"],
];

const tables = (names: readonly LayerName[]): Group[] => [
  ["0", "SECTION"], ["2", "TABLES"],
  ["0", "TABLE"], ["2", "LTYPE"], ["70", "1"],
  ["0", "LTYPE"], ["2", "CONTINUOUS"], ["70", "0"], ["3", "Solid line"], ["72", "65"], ["73", "0"], ["40", "0"],
  ["0", "ENDTAB"],
  ["0", "TABLE"], ["2", "LAYER"], ["70", String(names.length + 1)],
  ...[{ layer: "0", colour: 7 }, ...names.map((name) => PROCESSING_STEPS[name].dxf)].flatMap(({ layer, colour }): Group[] => [
    ["0", "LAYER"], ["2", layer], ["70", "0"], ["62", String(colour)], ["6", "CONTINUOUS"],
  ]),
  ["0", "ENDTAB"], ["0", "ENDSEC"],
];
