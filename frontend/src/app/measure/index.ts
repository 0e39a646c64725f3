export { elementName } from './element-names';
export { MemberPicture } from './member-picture';
export { PartPicker } from './part-picker';
export { finishNames, reliefNames } from './relief-names';
export { ShapeCards } from './shape-cards';
export { shapeEntries } from './shape-entries';
export { ShapeForm } from './shape-form';
export { ShapeGlyph } from './shape-glyph';
export { shapeNames } from './shape-names';
