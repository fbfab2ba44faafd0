/** The colours of app/globals.css for what is drawn in 3D, where no class reaches. */
export const palette = {
  brass: '#e0ae4e',
  steel: '#9fc0da',
} as const;
