/** Outside these a reading says more about the sample than about the paper. */
export const leastResponse = 0.4
export const mostResponse = 1.6

/** Response held between its bounds, to two decimals. */
export const holdResponse = (response: number): number => Math.round(Math.min(mostResponse, Math.max(leastResponse, response)) * 100) / 100
