// A PostgreSQL cluster of our own on loopback: the door to the parts in postgres/. It never touches the cluster that
// the distribution's package may have made.
export { type Cluster, type ClusterOptions, startCluster } from "./postgres/cluster.ts";
export {
  createDatabase,
  databaseUrls,
  dropDatabase,
  ensureDatabase,
  makeTemplate,
} from "./postgres/databases.ts";
export { choosePlace, type Place, temporaryPlace } from "./postgres/place.ts";
export { PostgresProblem } from "./postgres/problem.ts";
