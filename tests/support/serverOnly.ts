/** Stands in for the package `server-only`, which refuses to load outside of Next's server. */
export {};
