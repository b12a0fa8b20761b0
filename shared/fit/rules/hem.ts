import { type Rule } from '../rule.ts'

export const hemRules: readonly Rule[] = []
