/** First parts of query keys, where a feature makes out of date what another shows. */
export const keyRoots = {
  me: "me",
  /** Lists of public builds and of public entries. */
  lists: "lists",
  /** A public build's page and its entries, by slug. */
  build: "build",
  entry: "entry",
  person: "person",
} as const;
