/** The package's main file is CommonJS under an ESM name; this one loads, but has no types. */
declare module 'maxrects-packer/dist/maxrects-packer.mjs' {
  export * from 'maxrects-packer/dist/index';
}
