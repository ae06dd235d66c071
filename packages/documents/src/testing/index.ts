export { clinicProject, si } from './clinic-project.ts'
export { documentOptions } from './document-options.ts'
export { reviewedOptions } from './reviewed-options.ts'
