/**
 * Every cause the catalogue knows, by zone file. One list, so that a rule can name a rival in another file and a misspelt name
 * does not compile. A cause added here needs its rule in that file; the tests hold both ways.
 */
export const causesByZone = {
  neck: ['neck-tight', 'neck-front-loose', 'neck-back-loose', 'neck-forward', 'neck-high-jacket', 'collar-stands-away', 'collar-low', 'collar-edge-long', 'collar-edge-short'],
  shoulder: ['shoulder-long', 'shoulder-short', 'square-shoulders', 'sloping-shoulders', 'low-shoulder', 'forward-shoulder', 'shoulder-curve-full', 'shoulder-curve-hollow'],
  upperBack: [
    'round-back', 'round-neck-base', 'flat-back', 'broad-back', 'narrow-back', 'full-blades', 'back-armhole-loose', 'stooping-front-long', 'erect-back-long', 'back-tight-below-armhole',
  ],
  bust: [
    'full-bust', 'full-bust-princess', 'full-bust-dartless', 'small-bust', 'bust-point-low', 'bust-point-high', 'dart-tip-peak', 'bust-span-wide', 'bust-span-narrow', 'hollow-chest',
    'front-long-above-waist', 'button-off-bust', 'narrow-chest', 'bust-girth-tight', 'bust-girth-loose', 'full-breastbone', 'large-chest',
  ],
  armhole: ['armhole-high', 'armhole-low', 'front-armhole-loose', 'armhole-large', 'armhole-corner', 'armhole-balance', 'armhole-pulled-back', 'armhole-line'],
  sleeve: [
    'full-upper-arm', 'thin-upper-arm', 'cap-short', 'cap-high', 'cap-ease-much', 'sleeve-pitch-forward', 'sleeve-pitch-back', 'sleeve-long', 'sleeve-short', 'elbow-tight', 'forearm-tight',
    'cap-base-wide', 'cap-high-for-reach', 'raglan-sloping', 'raglan-square', 'dropped-shoulder-folds', 'jacket-sleeve-hang', 'kimono-underarm-low',
  ],
  waist: [
    'bodice-short', 'bodice-long', 'hollow-back', 'waist-front-low', 'waist-front-high', 'waist-tight', 'waist-loose', 'skirt-slips', 'midriff-tight', 'waist-back-loose', 'waistband-top-loose',
    'waist-shape-high', 'waist-shape-low',
  ],
  abdomen: ['full-abdomen-skirt', 'full-abdomen-trousers', 'full-abdomen-bodice', 'flat-abdomen', 'full-abdomen-gathers', 'large-waist-jacket'],
  hip: ['hip-tight', 'hip-loose', 'hip-high-one-side', 'hip-full-one-side', 'hip-square', 'hip-low', 'hip-dart-point', 'side-seam-sewn', 'hem-narrow', 'pleats-spread', 'jacket-hip-tight'],
  seat: ['full-seat-skirt', 'flat-seat-skirt', 'hollow-back-skirt'],
  crotch: [
    'rise-short', 'rise-long', 'back-crotch-short', 'full-seat-trousers', 'flat-seat-trousers', 'front-crotch-short', 'front-crotch-long', 'front-crotch-curve', 'seat-angle-large', 'fly-recedes',
    'seat-seam-short', 'front-waist-wide', 'front-waist-tilt', 'legs-crawl',
  ],
  leg: ['thigh-front-tight', 'thigh-inner-tight', 'thigh-loose', 'calf-tight', 'knee-inward', 'knee-outward', 'leg-open', 'leg-twist', 'leg-wide', 'knee-loose'],
  hem: ['hem-short', 'hem-long', 'hem-uneven', 'hem-bias-drop', 'side-seam-forward', 'side-seam-back', 'grain-off-level', 'balance-back-short', 'balance-back-long', 'hem-corner'],
  elastic: [
    'pull-on-narrow', 'elastic-short', 'elastic-long', 'elastic-front-low', 'elastic-back-low', 'gathers-much', 'gathers-tight', 'gathers-uneven', 'casing-narrow', 'pull-on-rise-long',
    'smock-front-short', 'blouse-uneven', 'yoke-tight', 'loose-crotch-low',
  ],
} as const

export type ZoneFile = keyof typeof causesByZone
export type Cause = (typeof causesByZone)[ZoneFile][number]
export const causes: readonly Cause[] = Object.values(causesByZone).flat()
