/** What antd and the router ask of a browser and jsdom does not have. */
const { TextDecoder, TextEncoder } = require('node:util');

Object.assign(globalThis, { TextDecoder, TextEncoder });
globalThis.matchMedia ??= (query) => ({
  matches: false,
  media: query,
  onchange: null,
  addEventListener() {},
  removeEventListener() {},
  addListener() {},
  removeListener() {},
  dispatchEvent: () => false,
});
globalThis.ResizeObserver ??= class {
  observe() {}
  unobserve() {}
  disconnect() {}
};
// jsdom knows no pseudo-elements and complains at length about the second argument.
const getComputedStyle = globalThis.getComputedStyle.bind(globalThis);
globalThis.getComputedStyle = (element) => getComputedStyle(element);
globalThis.scrollTo = () => {};
Element.prototype.scrollIntoView ??= () => {};
// antd's Select waits one task by it; Node's own would keep the test process open.
globalThis.MessageChannel ??= class {
  constructor() {
    this.port1 = { onmessage: null, close() {} };
    this.port2 = { postMessage: () => setTimeout(() => this.port1.onmessage?.({}), 0), close() {} };
  }
};

// The router wraps each navigation in a Request; it reads no more of it than this.
globalThis.Request ??= class {
  constructor(url, { method = 'GET', signal } = {}) {
    Object.assign(this, { url: String(url), method, signal, headers: new Map() });
  }
};
globalThis.structuredClone ??= (value) => JSON.parse(JSON.stringify(value));
