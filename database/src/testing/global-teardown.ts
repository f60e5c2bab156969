import { removeCluster } from './global-setup';

export default function stopTestCluster(): void {
  const folder = process.env.TEST_CLUSTER_FOLDER;
  if (folder) removeCluster(folder);
}
