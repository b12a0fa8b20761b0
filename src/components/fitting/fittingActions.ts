/** What the screen around the fitting does for it: routes and preferences. */
export type FittingActions = {
  compare: () => void
  list: () => void
  open: (address: string) => void
  stepMm: () => number
  enabled: () => boolean
}
