import { type Rule } from '../rule.ts'

export const crotchRules: readonly Rule[] = []
