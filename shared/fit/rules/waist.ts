import { type Rule } from '../rule.ts'

export const waistRules: readonly Rule[] = []
