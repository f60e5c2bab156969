export { CautionList, CautionMark, SEVERITY_ORDER, SeverityShape } from './caution-mark';
