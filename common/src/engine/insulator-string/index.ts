export { assessString, type StringAssessment } from './assess';
