export { TraceArea } from './trace-area';
export { SourceWords, TraceLines, TraceStep } from './trace-lines';
export { TraceSourceContext, type TraceSource } from './trace-source';
