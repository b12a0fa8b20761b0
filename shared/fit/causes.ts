/**
 * Every cause the catalogue knows, by zone file. One list, so that a rule can name a rival in another file and a misspelt name
 * does not compile. A cause added here needs its rule in that file; the tests hold both ways.
 */
export const causesByZone = {
  neck: ['neck-tight', 'neck-front-loose', 'neck-back-loose'],
  shoulder: ['shoulder-long', 'shoulder-short', 'square-shoulders', 'sloping-shoulders', 'low-shoulder', 'forward-shoulder'],
  upperBack: ['round-back', 'flat-back', 'broad-back', 'narrow-back'],
  bust: ['full-bust', 'small-bust', 'bust-point-low', 'bust-point-high', 'bust-girth-tight', 'bust-girth-loose'],
  armhole: ['armhole-high', 'front-armhole-loose', 'armhole-low'],
  sleeve: ['full-upper-arm', 'thin-upper-arm', 'sleeve-long', 'sleeve-short'],
  waist: ['bodice-short', 'bodice-long', 'hollow-back', 'waist-front-low', 'waist-front-high', 'waist-tight', 'waist-loose', 'skirt-slips', 'midriff-tight', 'waist-back-loose', 'waistband-top-loose', 'waist-shape-high', 'waist-shape-low'],
  abdomen: ['full-abdomen-skirt', 'full-abdomen-trousers', 'flat-abdomen', 'large-waist-jacket', 'full-abdomen-bodice', 'full-abdomen-gathers'],
  hip: ['hip-tight', 'hip-loose', 'hip-high-one-side', 'hip-full-one-side', 'hip-square', 'hip-low', 'hip-dart-point', 'side-seam-sewn', 'hem-narrow', 'pleats-spread', 'jacket-hip-tight'],
  seat: ['full-seat-skirt', 'flat-seat-skirt', 'hollow-back-skirt'],
  crotch: ['rise-short', 'rise-long', 'back-crotch-short', 'full-seat-trousers', 'flat-seat-trousers', 'front-crotch-short', 'front-crotch-long', 'seat-angle-large', 'front-crotch-curve', 'fly-recedes', 'seat-seam-short', 'front-waist-wide', 'front-waist-tilt', 'legs-crawl'],
  leg: ['thigh-inner-tight', 'thigh-loose', 'knee-inward', 'knee-outward', 'thigh-front-tight', 'calf-tight', 'leg-open', 'leg-twist', 'leg-wide', 'knee-loose'],
  hem: ['hem-short', 'hem-long', 'side-seam-forward', 'side-seam-back', 'hem-uneven', 'hem-bias-drop', 'grain-off-level', 'balance-back-short', 'balance-back-long', 'hem-corner'],
  elastic: ['pull-on-narrow', 'elastic-short', 'elastic-long', 'elastic-front-low', 'elastic-back-low', 'gathers-much', 'gathers-tight', 'gathers-uneven', 'casing-narrow', 'pull-on-rise-long', 'smock-front-short', 'blouse-uneven', 'yoke-tight', 'loose-crotch-low'],
} as const

export type ZoneFile = keyof typeof causesByZone
export type Cause = (typeof causesByZone)[ZoneFile][number]
export const causes: readonly Cause[] = Object.values(causesByZone).flat()
