import startTestCluster from '../../database/src/testing/global-setup';
import stopTestCluster from '../../database/src/testing/global-teardown';
import { startProduct, type ProductProcess } from '../test/support/product-process';

let running: Promise<ProductProcess> | null = null;

/** The product as it is shipped, over a database of its own; started for the first figure that asks for it. */
export function product(): Promise<ProductProcess> {
  if (!running) {
    startTestCluster();
    running = startProduct();
  }
  return running;
}

export async function stopProduct(): Promise<void> {
  if (!running) return;
  try {
    await (await running).stop();
  } finally {
    stopTestCluster();
  }
}
