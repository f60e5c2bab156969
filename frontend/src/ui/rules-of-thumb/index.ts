export { BridgeTable } from './bridge-table';
export { RuleCards } from './rule-cards';
