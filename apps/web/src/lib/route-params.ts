import { useParams, type Params } from 'react-router-dom'

/** A parameter of the address that the route guarantees. */
export const requireParam = (params: Params, name: string): string => {
  const value = params[name]
  if (value === undefined) throw new Error(`the route has no :${name}`)
  return value
}

export const useProjectNumber = (): string => requireParam(useParams(), 'project')
