export { ShapeCards } from './shape-cards';
export { ShapeGlyph } from './shape-glyph';
export { shapeNames } from './shape-names';
