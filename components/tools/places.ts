/** The tools of the design screen, by what their button says. */
export const openers = {
  'old-plate': 'Copy an old plate',
  'printed-dial': 'Follow a printed dial',
  'two-circuits': 'Two circuits on one shaft',
  'plates-that-fit': 'Which plates and gap fit',
  tolerance: 'What tolerances do to it',
  'voltage-and-loss': 'Voltage, loss and drift',
  dial: 'A dial to print',
  sheets: 'Lay out on sheets',
} as const;

export type ToolName = keyof typeof openers;

/** Where a tool is opened from: where its answer is used. */
export const toolsAt = {
  law: ['old-plate', 'printed-dial', 'two-circuits'],
  stack: ['plates-that-fit'],
  checks: ['voltage-and-loss'],
  held: ['tolerance', 'dial'],
  files: ['sheets'],
} as const satisfies Record<string, readonly ToolName[]>;

export type ToolPlace = keyof typeof toolsAt;
