import { join } from 'node:path'

/** The demo catalogue of invented makers. */
export const exampleCatalogueFile = (examplesFolder: string): string => join(examplesFolder, 'catalogue', 'vessels.csv')
