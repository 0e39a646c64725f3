export { ChangeList } from './change-list';
export { FieldWords } from './field-words';
export { fieldNames } from './field-names';
