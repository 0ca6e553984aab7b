/** Which of the label's typefaces a text is set in. */
export type LabelFace = 'sans' | 'sansBold' | 'mono';

/** One line of text. Places in mm from the label's upper left corner. */
export interface TextBox {
  role: 'number' | 'kind' | 'load' | 'code' | 'company' | 'notice';
  text: string;
  face: LabelFace;
  /** Em size. */
  sizeMm: number;
  xMm: number;
  baselineMm: number;
  widthMm: number;
}

/** The code, quiet zone not included; every figure is whole printer dots. */
export interface QrBox {
  xMm: number;
  yMm: number;
  moduleMm: number;
  moduleDots: number;
  /** Modules a side without the quiet zone. */
  side: number;
}

export interface LabelLayout {
  widthMm: number;
  heightMm: number;
  qr: QrBox;
  texts: TextBox[];
}

/** Width of a text in em. Handed in, so that the layout needs no font files. */
export type MeasureText = (text: string, face: LabelFace) => number;
