import PDFDocument from 'pdfkit';
import { mark } from '@second-spanner/shared/drawing/mark';
import { draw } from './draw.js';
import { fonts, printable, type FontName } from './fonts.js';
import type { Frame } from './frame.js';

/** Points. More than the 10 mm that must be kept. */
export const margin = 32;
const headHeight = 40;
const footHeight = 62;
const gap = 14;
export const grey = '#404040';

export interface TextStyle {
  readonly font?: FontName;
  readonly size?: number;
  readonly colour?: string;
  readonly width?: number;
  readonly align?: 'left' | 'right' | 'center';
}

/** A part of the page's width. */
export interface Column {
  readonly x: number;
  readonly width: number;
}

/** Pages with the same head and foot, filled from the top down. */
export class Pages {
  readonly document: PDFKit.PDFDocument;
  /** Where the next thing stands. */
  y = 0;
  private column: Column | null = null;

  constructor(private readonly frame: Frame) {
    this.document = new PDFDocument({
      size: frame.paper === 'a4' ? 'A4' : 'LETTER',
      margin: 0,
      bufferPages: true,
      autoFirstPage: false,
      lang: 'en',
      displayTitle: true,
      // None, or Helvetica slips in.
      font: '',
      info: {
        Title: frame.title,
        Author: frame.author,
        Producer: 'Second Spanner',
        Creator: 'Second Spanner',
        CreationDate: frame.made,
      },
    });
    for (const [name, font] of Object.entries(fonts)) this.document.registerFont(name, font);
    this.next();
  }

  get left(): number {
    return this.column?.x ?? margin;
  }
  get width(): number {
    return this.column?.width ?? this.document.page.width - 2 * margin;
  }
  get bottom(): number {
    return this.document.page.height - margin - footHeight;
  }

  next(): void {
    const { column } = this;
    this.column = null;
    this.document.addPage();
    this.head();
    this.column = column;
    this.y = margin + headHeight + gap;
  }

  /** Pages of the same size on which something can be drawn to see how high it is. They are thrown away. */
  trial(): Pages {
    return new Pages(this.frame);
  }

  /** Fills a column from the present place down, as if it were the page. */
  within(column: Column, fill: () => void): void {
    this.column = column;
    fill();
    this.column = null;
  }

  /** Begins a new page when less than `height` is left. */
  need(height: number): void {
    if (this.y + height > this.bottom) this.next();
  }

  /** Writes a text at a point and gives back its height. */
  text(words: string, x: number, y: number, style: TextStyle = {}): number {
    const { font = 'text', size = 9, colour = '#000000', width = this.width, align = 'left' } = style;
    const printed = printable(words);
    this.document.font(font).fontSize(size).fillColor(colour);
    const long = this.lineWidth(printed, width);
    if (long === undefined) {
      this.document.text(printed, x, y, { width, align });
      return this.document.y - y;
    }
    const room = { left: 0, center: (width - long) / 2, right: width - long }[align];
    this.document.text(printed, x + room, y, { lineBreak: false });
    return this.document.currentLineHeight(true);
  }

  /** The height that a text takes, broken into lines of a width. */
  heightOf(words: string, width: number, font: FontName, size: number): number {
    const printed = printable(words);
    this.document.font(font).fontSize(size);
    return this.lineWidth(printed, width) === undefined
      ? this.document.heightOfString(printed, { width })
      : this.document.currentLineHeight(true);
  }

  /** The width of a text on one line. */
  widthOf(words: string, font: FontName, size: number): number {
    return this.document.font(font).fontSize(size).widthOfString(printable(words));
  }

  /** The width of a text that fits on one line, as most do: those need not be broken into lines, which is slow. */
  private lineWidth(printed: string, width: number): number | undefined {
    if (printed.includes('\n')) return undefined;
    const long = this.document.widthOfString(printed);
    return long <= width ? long : undefined;
  }

  /** A text across the page, below what stands; moves down. */
  paragraph(words: string, style: TextStyle = {}): void {
    const { font = 'text', size = 9, width = this.width } = style;
    this.need(this.heightOf(words, width, font, size));
    this.y += this.text(words, this.left, this.y, style) + 3;
  }

  rule(y: number, weight = 0.5, x = this.left, width = this.width): void {
    this.document
      .lineWidth(weight)
      .moveTo(x, y)
      .lineTo(x + width, y)
      .stroke('#000000');
  }

  private head(): void {
    const { caption, name, cells } = this.frame.head;
    const top = margin;
    this.document.lineWidth(1.4).rect(this.left, top, this.width, headHeight).stroke('#000000');
    draw(this.document, mark, this.left + 8, top + 7, 26);
    let x = this.left + this.width;
    for (const cell of [...cells].reverse()) {
      x -= cell.width;
      this.document
        .lineWidth(0.8)
        .moveTo(x, top)
        .lineTo(x, top + headHeight)
        .stroke('#000000');
      const width = cell.width - 10;
      this.text(cell.caption, x + 7, top + 7, { font: 'plate', size: 8, width, colour: grey });
      this.text(cell.value, x + 7, top + 19, { font: cell.font, size: 10.5, width });
    }
    const width = x - this.left - 50;
    this.text(caption, this.left + 44, top + 7, { font: 'plate', size: 8, width, colour: grey });
    this.text(name, this.left + 44, top + 18, { font: 'text-medium', size: 12, width });
  }

  /** Writes the foot of every page, now that their number is known, and ends the document. */
  async finish(): Promise<Buffer> {
    const { count } = this.document.bufferedPageRange();
    for (let page = 0; page < count; page += 1) {
      this.document.switchToPage(page);
      this.foot(page + 1, count);
    }
    this.document.end();
    const chunks: Buffer[] = [];
    for await (const chunk of this.document) chunks.push(chunk as Buffer);
    return Buffer.concat(chunks);
  }

  private foot(page: number, count: number): void {
    const top = this.document.page.height - margin - footHeight + 10;
    this.rule(top, 1.2);
    this.frame.foot(this, top);
    const right = { width: 180, align: 'right' } as const;
    const x = this.left + this.width - 180;
    this.text(this.frame.note, x, top + 20, { ...right, font: 'plate', size: 8, colour: grey });
    this.text(`Page ${page} of ${count}`, x, top + 32, { ...right, font: 'text-medium', size: 10.5 });
  }
}
