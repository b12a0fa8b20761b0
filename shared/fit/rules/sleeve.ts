import { type Rule } from '../rule.ts'

export const sleeveRules: readonly Rule[] = []
