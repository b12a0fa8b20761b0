import { type Rule } from '../rule.ts'

export const hipRules: readonly Rule[] = []
