/** Every address of the site, in one place. */
export const paths = {
  home: () => "/",
  builds: () => "/builds",
  buildsWith: (query: { status?: string | undefined; after?: string | undefined }) => {
    const given = Object.entries(query).filter((pair): pair is [string, string] => pair[1] !== undefined);
    return given.length > 0 ? `/builds?${new URLSearchParams(given)}` : "/builds";
  },
  build: (build: string) => `/builds/${build}`,
  buildAtomFeed: (build: string) => `/builds/${build}/feed.atom`,
  buildJsonFeed: (build: string) => `/builds/${build}/feed.json`,
  entry: (build: string, entry: string) => `/builds/${build}/entries/${entry}`,
  person: (handle: string) => `/people/${handle}`,
  signIn: (next?: string) => (next ? `/sign-in?next=${encodeURIComponent(next)}` : "/sign-in"),
  /** Takes a form without JavaScript. */
  signOut: () => "/sign-out",
  signUp: () => "/sign-up",
  forgotPassword: () => "/forgot-password",
  resetPassword: () => "/reset-password",
  verifyEmail: () => "/verify-email",
  account: () => "/account",
  workshop: () => "/workshop",
  newBuild: () => "/workshop/builds/new",
  ownBuild: (build: string) => `/workshop/builds/${build}`,
  entryEditor: (entryId: string) => `/workshop/entries/${entryId}`,
  entryHistory: (entryId: string) => `/workshop/entries/${entryId}/history`,
  atomFeed: () => "/feed.atom",
  jsonFeed: () => "/feed.json",
  kit: () => "/dev/kit",
  mailFake: () => "/dev/mail",
} as const;
