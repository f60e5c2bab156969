export { TraceArea } from './trace-area';
export { SourceWords, TraceLines } from './trace-lines';
export { TraceSourceContext, type TraceSource } from './trace-source';
