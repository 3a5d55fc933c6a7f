// One carton on one sheet at 1 : 1, as PDF with processing steps.
import { PDFDocument, PDFHexString, PDFName, PDFString } from "pdf-lib";
import { boundsOf } from "../../geometry/path";
import type { Box, Path } from "../../geometry/outline";
import type { Carton, LayerName } from "../../types";
import { drawingOf } from "../drawing";
import { layersSeen, seenBox, sideWords } from "../sheet-view";
import { constructionText, legendOf, type SheetFacts } from "../title-block";
import { drawLayers } from "./blank";
import { drawFolded, placeForPicture } from "./folded";
import { drawFigures } from "./figures";
import { embedFaces, oneLine, type Faces, type FontBytes } from "./fonts";
import { createInk, POINTS, type Ink } from "./ink";
import { groupsFor, registerGroups } from "./layer-groups";
import { pageFor, setBoxes } from "./page-boxes";
import { fingerprint } from "./fingerprint";
import { drawFrame, drawLegend, drawNotes, drawTitleBlock, legendHeight, notesHeight } from "./sheet";

export interface PdfOptions extends SheetFacts {
  /** Lato, unpacked to TrueType; latin first, then latin-ext. */
  readonly fonts: FontBytes;
}

/** Everything that people typed and that is printed: tells which font files are needed. */
export const typedTexts = (carton: Carton, facts: SheetFacts): string[] => [
  facts.title, facts.client, facts.revision, facts.date, facts.drawnBy ?? "", carton.board.name, constructionText(carton), ...carton.panels.map((p) => p.label.toUpperCase()), carton.fold.steps.at(-1)?.label ?? "",
];

/**
 * The carton as a PDF of one page that grows with the blank; always at 1 : 1. One optional-content group and one spot
 * separation a layer, overprinting; TrimBox round the blank, BleedBox round its bleed. The same input gives the same bytes.
 */
export async function pdfOf(carton: Carton, options: PdfOptions): Promise<Uint8Array> {
  const document = await PDFDocument.create({ updateMetadata: false });
  const faces = await embedFaces(document, options.fonts, typedTexts(carton, options));
  const drawing = drawingOf(carton, { side: options.side });
  const layers = layersSeen(carton, options.side);
  const { bounds } = drawing;
  // Asked for its width once, a character without a shape is known before the notes are written.
  for (const text of typedTexts(carton, options)) faces.regular.width(oneLine(text), 1);
  const layout = pageFor({
    width: bounds.maxX - bounds.minX, height: bounds.maxY - bounds.minY,
    legendHeight: legendHeight(legendOf(carton, options.side).length), notesHeight: notesHeight(carton, drawing, faces),
  });
  const { stage, picture } = placeForPicture(layout, drawing, carton, faces);
  const dx = (stage.minX + stage.maxX - bounds.minX - bounds.maxX) / 2;
  const dy = (stage.minY + stage.maxY - bounds.minY - bounds.maxY) / 2;
  const groups = registerGroups(document, groupsFor((name: LayerName) => layers[name].length > 0));
  const ink = createInk();
  drawFrame(ink, layout, faces);
  ink.moved(dx, dy, () => {
    drawLayers(ink, layers);
    drawFigures(ink, drawing, faces);
  });
  drawTitleBlock(ink, layout.titleBlock, carton, options, faces);
  drawLegend(ink, layout.legend, carton, options, faces);
  drawNotes(ink, layout.notes, carton, drawing, faces);
  if (picture) drawFolded(ink, picture, carton, faces);
  addPage(document, layout.width, layout.height, ink, faces, groups, (page) => {
    const trim = seenBox(carton.blank.bounds, options.side);
    setBoxes(page, trim, bleedBox(trim, layers.bleed.map((p) => p.path)), dx, dy);
  });
  return finished(document, options, ink.content());
}

const bleedBox = (trim: Box, bleed: readonly Path[]): Box => {
  if (bleed.length === 0) return trim;
  const b = boundsOf(bleed);
  return { minX: Math.min(b.minX, trim.minX), minY: Math.min(b.minY, trim.minY), maxX: Math.max(b.maxX, trim.maxX), maxY: Math.max(b.maxY, trim.maxY) };
};

type Page = ReturnType<PDFDocument["addPage"]>;

/** A page of this size in mm with what the ink wrote. */
export function addPage(document: PDFDocument, width: number, height: number, ink: Ink, faces: Faces, groups: { attach(page: Page): void }, dress: (page: Page) => void): void {
  const page = document.addPage([width * POINTS, height * POINTS]);
  groups.attach(page);
  faces.attach(page);
  const content = `q ${POINTS} 0 0 ${POINTS} 0 0 cm\n${ink.content()}\nQ`;
  page.node.set(PDFName.of("Contents"), document.context.register(document.context.flateStream(content)));
  dress(page);
}

/** Names the document and saves it. Dates come from the options alone, so that nothing depends on when it is made. */
export async function finished(document: PDFDocument, facts: SheetFacts, content: string): Promise<Uint8Array> {
  document.setTitle(`${oneLine(facts.title)}, revision ${oneLine(facts.revision)}, ${sideWords(facts.side)}`, { showInWindowTitleBar: true });
  document.setSubject("Calculated: cut and fold a sample before the run. Units mm, scale 1 : 1.");
  document.setCreator("Cartonwright");
  document.setProducer("Cartonwright");
  if (facts.drawnBy !== undefined && facts.drawnBy !== "") document.setAuthor(oneLine(facts.drawnBy));
  const day = /^(\d{4})-(\d{2})-(\d{2})/.exec(facts.date);
  const info = document.context.trailerInfo.Info;
  const dict = info === undefined ? undefined : document.context.lookup(info);
  if (day && dict && "set" in dict) (dict as { set(key: PDFName, value: PDFString): void }).set(PDFName.of("CreationDate"), PDFString.of(`D:${day[1]}${day[2]}${day[3]}000000Z`));
  const id = PDFHexString.of(fingerprint(`${facts.title}\n${facts.revision}\n${facts.side}\n${facts.date}\n${content}`));
  document.context.trailerInfo.ID = document.context.obj([id, id]);
  document.setLanguage("en");
  return document.save({ useObjectStreams: false, addDefaultPage: false });
}
