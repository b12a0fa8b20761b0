import { type Rule } from '../rule.ts'

export const elasticRules: readonly Rule[] = []
