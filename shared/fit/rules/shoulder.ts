import { type Rule } from '../rule.ts'

export const shoulderRules: readonly Rule[] = []
