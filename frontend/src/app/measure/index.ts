export { ShapeCards } from './shape-cards';
export { ShapeGlyph } from './shape-glyph';
export { elementName } from './element-names';
export { finishNames, reliefNames } from './relief-names';
export { shapeNames } from './shape-names';
