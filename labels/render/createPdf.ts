import PDFDocument from 'pdfkit';

/** A fixed day, so that the same labels always give the same bytes. */
const FIXED_DATE = new Date(Date.UTC(2000, 0, 1));

/** Makes a PDF without a first page and collects its bytes; `draw` adds pages and draws. */
export function createPdf(title: string, draw: (doc: PDFKit.PDFDocument) => void): Promise<Buffer> {
  return new Promise((resolve, reject) => {
    const doc = new PDFDocument({
      margin: 0,
      autoFirstPage: false,
      info: { Title: title, Producer: 'Slingward', Creator: 'Slingward', CreationDate: FIXED_DATE },
    });
    const chunks: Buffer[] = [];
    doc.on('data', (chunk: Buffer) => chunks.push(chunk));
    doc.on('end', () => {
      resolve(Buffer.concat(chunks));
    });
    doc.on('error', reject);
    draw(doc);
    doc.end();
  });
}
