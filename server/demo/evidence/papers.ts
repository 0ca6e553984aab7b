import PDFDocument from 'pdfkit';

/** A paper of an invented firm: enough to open and read. */
export interface Paper {
  from: string;
  title: string;
  on: string;
  lines: readonly string[];
}

const PAPER_MARGIN_PT = 64;

export function writePaper({ from, title, on, lines }: Paper): Promise<Buffer> {
  const document = new PDFDocument({
    size: 'A4',
    margin: PAPER_MARGIN_PT,
    info: { Title: title, Author: from },
  });
  const parts: Buffer[] = [];
  const done = new Promise<Buffer>((resolve, reject) => {
    document.on('data', (part: Buffer) => parts.push(part));
    document.on('end', () => resolve(Buffer.concat(parts)));
    document.on('error', reject);
  });
  document.font('Helvetica-Bold').fontSize(18).text(from).moveDown(0.3);
  document.fontSize(13).text(title).moveDown(0.3);
  document.font('Helvetica').fontSize(11).text(on).moveDown(1.2);
  for (const line of lines) document.text(line).moveDown(0.5);
  document.moveDown(2).fillColor('#555555').text('Invented for the demo: no such firm, no such slings.');
  document.end();
  return done;
}
