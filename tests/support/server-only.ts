/** Stands in for Next's marker of server code, which has nothing in it either. */
export {};
