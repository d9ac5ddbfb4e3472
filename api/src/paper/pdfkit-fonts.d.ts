import type { Font } from 'fontkit';

// Since 0.20 pdfkit takes a font that is parsed already; its types do not know that yet.
declare global {
  namespace PDFKit.Mixins {
    interface PDFFont {
      registerFont(name: string, font: Font): this;
    }
  }
}
