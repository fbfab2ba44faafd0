/** The colours of app/globals.css for what is drawn on a canvas, where no class reaches. */
export const palette = {
  panel: '#f8fafa',
  line: '#c5cdcd',
  ink: '#14201f',
  ink2: '#4a5655',
  action: '#2f45a6',
  brass: '#e0ae4e',
  brassDark: '#805408',
  steel: '#9fc0da',
  steelDark: '#2f5f80',
  bad: '#b3261e',
} as const;
