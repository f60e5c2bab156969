import type { Font } from 'fontkit';

declare global {
  namespace PDFKit {
    namespace Mixins {
      interface PDFFont {
        /** A font that is open already, shared by all documents of the process. */
        registerFont(name: string, src: Font): this;
      }
      interface TextOptions {
        /** Width that is known already; without it the text is measured again. */
        textWidth?: number;
        wordCount?: number;
      }
    }
  }
}
