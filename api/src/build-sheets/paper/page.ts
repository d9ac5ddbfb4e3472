import PDFDocument from 'pdfkit';
import { mark } from '@second-spanner/shared/drawing/mark';
import type { BuildSheet } from '../build-sheet.js';
import { draw } from './draw.js';
import { fonts, printable, type FontName } from './fonts.js';
import { drawCode, runsOf, type Run } from './quick-response.js';

/** Points. More than the 10 mm that must be kept. */
export const margin = 32;
const headHeight = 40;
const footHeight = 62;
const gap = 14;
const grey = '#404040';

export interface TextStyle {
  readonly font?: FontName;
  readonly size?: number;
  readonly colour?: string;
  readonly width?: number;
  readonly align?: 'left' | 'right' | 'center';
}

/** Pages with the same head and foot, filled from the top down. */
export class Pages {
  readonly document: PDFKit.PDFDocument;
  /** Where the next thing stands. */
  y = 0;
  private code: readonly Run[] | undefined;

  constructor(private readonly build: BuildSheet) {
    const { sheet } = build;
    this.document = new PDFDocument({
      size: build.paper === 'a4' ? 'A4' : 'LETTER',
      margin: 0,
      bufferPages: true,
      autoFirstPage: false,
      lang: 'en',
      displayTitle: true,
      // None, or Helvetica slips in.
      font: '',
      info: {
        Title: `Build sheet ${sheet.code}, ${sheet.carName}, engine ${sheet.engineCode}`,
        Author: build.shopName,
        Producer: 'Second Spanner',
        Creator: 'Second Spanner',
        // Fixed, so that two renderings are the same to the byte.
        CreationDate: new Date(sheet.changedAt),
      },
    });
    for (const [name, font] of Object.entries(fonts)) this.document.registerFont(name, font);
    this.next();
  }

  get left(): number {
    return margin;
  }
  get width(): number {
    return this.document.page.width - 2 * margin;
  }
  get bottom(): number {
    return this.document.page.height - margin - footHeight;
  }

  next(): void {
    this.document.addPage();
    this.head();
    this.y = margin + headHeight + gap;
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
    const { sheet } = this.build;
    const cells: readonly (readonly [string, string, number, FontName])[] = [
      ['Sheet', sheet.code, 74, 'figures-medium'],
      ['Spec', `${sheet.engineCode}, edition ${sheet.specEdition}`, 96, 'text-medium'],
      ['Engine number', sheet.engineNumber, 104, 'figures-medium'],
    ];
    const top = margin;
    this.document.lineWidth(1.4).rect(this.left, top, this.width, headHeight).stroke('#000000');
    draw(this.document, mark, this.left + 8, top + 7, 26);
    let x = this.left + this.width;
    for (const [caption, value, width, font] of [...cells].reverse()) {
      x -= width;
      this.document
        .lineWidth(0.8)
        .moveTo(x, top)
        .lineTo(x, top + headHeight)
        .stroke('#000000');
      this.text(caption, x + 7, top + 7, { font: 'plate', size: 8, width: width - 10, colour: grey });
      this.text(value, x + 7, top + 19, { font, size: 10.5, width: width - 10 });
    }
    const wide = x - this.left - 50;
    const title = this.isReleased ? 'Build sheet' : 'Build sheet: RUNNING, NOT SIGNED';
    this.text(title, this.left + 44, top + 7, { font: 'plate', size: 8, width: wide, colour: grey });
    this.text(`${sheet.carName}, engine ${sheet.engineCode}`, this.left + 44, top + 18, {
      font: 'text-medium',
      size: 12,
      width: wide,
    });
  }

  private get isReleased(): boolean {
    return this.build.sheet.state === 'released';
  }

  /** Writes the foot of every page, now that their number is known, and ends the document. */
  finish(): PDFKit.PDFDocument {
    const { count } = this.document.bufferedPageRange();
    for (let page = 0; page < count; page += 1) {
      this.document.switchToPage(page);
      this.foot(page + 1, count);
    }
    this.document.end();
    return this.document;
  }

  private foot(page: number, count: number): void {
    const top = this.document.page.height - margin - footHeight + 10;
    const { sheet, shopName, demo, verificationAddress } = this.build;
    this.rule(top, 1.2);
    const x = this.left;
    if (this.isReleased && sheet.verificationCode) {
      const address = `${verificationAddress}/${sheet.verificationCode}`;
      drawCode(this.document, (this.code ??= runsOf(address)), x, top + 8, 44);
      this.text('To check that this is the sheet that was signed', x + 54, top + 9, {
        font: 'plate',
        size: 8,
        width: 300,
      });
      this.text(sheet.verificationCode, x + 54, top + 20, { font: 'figures-medium', size: 11, width: 300 });
      this.text(address, x + 54, top + 36, { size: 8, width: 330, colour: grey });
    } else {
      this.text('Running sheet, not signed', x, top + 9, { font: 'text-strong', size: 12, width: 300 });
      this.text(
        `As it stood on version ${sheet.version}. It can't be verified until it is released.`,
        x,
        top + 27,
        {
          size: 8,
          width: 330,
          colour: grey,
        },
      );
    }
    const note = demo ? `${shopName}. Demo: all data invented.` : shopName;
    const right = { width: 180, align: 'right' } as const;
    const rightX = this.left + this.width - 180;
    this.text(note, rightX, top + 20, { ...right, font: 'plate', size: 8, colour: grey });
    this.text(`Page ${page} of ${count}`, rightX, top + 32, { ...right, font: 'text-medium', size: 10.5 });
  }
}
