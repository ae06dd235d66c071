export { clinicProject, si } from './clinic-project.ts'
export { documentOptions } from './document-options.ts'
