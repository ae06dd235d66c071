export { clinicProject, si } from './clinic-project.ts'
export { documentOptions } from './document-options.ts'
export { everyVessel } from './every-vessel.ts'
export { reviewedOptions } from './reviewed-options.ts'
