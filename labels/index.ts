export { labelData, NOT_THE_MAKERS_TAG, type LabelData } from './labelData';
export { findModuleDots } from './layout/layoutLabel';
export { chooseMask, chooseMasks } from './qr/chooseMask';
export { pickVersion, qrSymbol, type QrLevel, type QrSymbol } from './qr/symbol';
export { renderLabelPng } from './render/renderLabelPng';
export { renderLabels, type RenderOptions } from './render/renderLabels';
export { renderTestPage } from './render/renderTestPage';
export { findStock, LABEL_STOCKS, labelsPerPage } from './stocks';
export { labelStock, type LabelStock, type PrinterDpi } from './stockSchema';
