export { ChoiceField, type Choice, type ChoiceFieldProperties } from './choice-field';
export { DateField, readDay, type DateFieldProperties } from './date-field';
export { browserDecimalSign, decimalSignOf, editedText, type DecimalSign } from './decimal-sign';
export { FieldFrame, noteIdOf, type FieldWords } from './field-frame';
export { NumberField, type NumberFieldProperties } from './number-field';
export { readNumber, type NumberReading } from './read-number';
export { TextField, type TextFieldProperties } from './text-field';
