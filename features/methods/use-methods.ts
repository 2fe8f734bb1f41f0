import { useQuery } from '@tanstack/react-query'

/** The list of methods: a chunk of its own, so that the screens of a job do not wait for it. */
export function useMethods() {
  return useQuery({
    queryKey: ['methods'],
    queryFn: () => import('./method-table').then(({ METHODS }) => METHODS),
    networkMode: 'always',
    staleTime: Infinity,
    retry: false,
  })
}
