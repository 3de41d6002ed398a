import {
  decodePDFRawStream,
  PDFArray,
  PDFDict,
  PDFDocument,
  PDFName,
  PDFRawStream,
  type PDFObject,
  type PDFPage,
} from 'pdf-lib';

export interface ReadPdf {
  /** Width and height of the first sheet, mm. */
  size: readonly [number, number];
  /** What is written on each page, without spaces, in the order in which it was drawn. */
  pages: readonly string[];
}

const MM_PER_POINT = 25.4 / 72;

/** Text without the spaces, where a line may have been broken. */
export const dense = (text: string): string => text.replace(/\s/gu, '');

/** The pages of a printed document with the words on them. */
export async function readPdf(bytes: Uint8Array): Promise<ReadPdf> {
  const pages = (await PDFDocument.load(bytes)).getPages();
  const { width, height } = pages[0]?.getSize() ?? { width: 0, height: 0 };
  return {
    size: [width * MM_PER_POINT, height * MM_PER_POINT],
    pages: pages.map(wordsOn),
  };
}

function wordsOn(page: PDFPage): string {
  const contents = page.node.Contents();
  const streams = contents instanceof PDFArray ? contents.asArray() : contents ? [contents] : [];
  const resources = page.node.Resources();
  return streams.map((stream) => (resources ? wordsIn(page, stream, resources) : '')).join('');
}

/** Fonts chosen, texts shown as numbers of glyphs, and drawings that are used as a part. */
const TOKENS = /\/(\S+)\s+[\d.]+\s+Tf|<([0-9a-fA-F]+)>|\/(\S+)\s+Do\b/g;

interface Font {
  /** Hexadecimal digits of one glyph's number. */
  digits: number;
  letters: ReadonlyMap<number, string>;
}

const NO_FONT: Font = { digits: 2, letters: new Map() };

function wordsIn(page: PDFPage, stream: PDFObject, resources: PDFDict): string {
  const found = page.doc.context.lookup(stream);
  if (!(found instanceof PDFRawStream)) return '';
  let font = NO_FONT;
  let words = '';
  for (const [, name, shown, part] of decoded(found).matchAll(TOKENS)) {
    if (name) font = fontOf(page, inside(resources, 'Font', name));
    else if (shown) words += lettersOf(font, shown);
    else if (part) words += wordsOfPart(page, inside(resources, 'XObject', part));
  }
  return dense(words);
}

const lettersOf = ({ digits, letters }: Font, shown: string): string =>
  inParts(shown, digits)
    .map((glyph) => letters.get(parseInt(glyph, 16)) ?? '')
    .join('');

const inParts = (text: string, length: number): string[] =>
  text.match(new RegExp(`.{${length}}`, 'g')) ?? [];

const decoded = (stream: PDFRawStream): string =>
  Buffer.from(decodePDFRawStream(stream).decode()).toString('latin1');

const inside = (resources: PDFDict, kind: string, name: string): PDFObject | undefined =>
  resources.lookupMaybe(PDFName.of(kind), PDFDict)?.lookup(PDFName.of(name));

function wordsOfPart(page: PDFPage, part: PDFObject | undefined): string {
  if (!(part instanceof PDFRawStream)) return '';
  const resources = part.dict.lookupMaybe(PDFName.of('Resources'), PDFDict);
  return resources ? wordsIn(page, part, resources) : '';
}

/** Which letters each glyph of a font stands for, from the table that a font brings for copying. */
function fontOf(page: PDFPage, font: PDFObject | undefined): Font {
  const table =
    font instanceof PDFDict
      ? page.doc.context.lookup(font.get(PDFName.of('ToUnicode')))
      : undefined;
  if (!(table instanceof PDFRawStream)) return NO_FONT;
  const letters = new Map<number, string>();
  let digits = NO_FONT.digits;
  const blocks = decoded(table).matchAll(/beginbf(char|range)([\s\S]*?)endbf/g);
  for (const [, kind, body = ''] of blocks)
    for (const line of body.trim().split('\n')) {
      const [from = '', to = '', text = ''] = line.match(/[0-9a-fA-F]+/g) ?? [];
      digits = from.length;
      const [first, last, written] = kind === 'char' ? [from, from, to] : [from, to, text];
      for (let at = parseInt(first, 16); at <= parseInt(last, 16); at += 1)
        letters.set(at, unicode(written, at - parseInt(first, 16)));
    }
  return { digits, letters };
}

/** Letters as the table writes them; in a range the last one counts on. */
const unicode = (hex: string, further: number): string => {
  const units = inParts(hex, 4).map((unit) => parseInt(unit, 16));
  const last = units.pop() ?? 0;
  return String.fromCharCode(...units, last + further);
};
