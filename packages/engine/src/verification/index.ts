export { casesNotRun } from './cases/not-run.ts'
export { verificationCases, verificationRows, type VerificationRow, type Verdict } from './rows.ts'
