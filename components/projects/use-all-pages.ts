import { useEffect } from 'react';

interface PagedList {
  readonly hasNextPage: boolean;
  readonly isFetching: boolean;
  readonly isError: boolean;
  fetchNextPage(): unknown;
}

/** Reads page after page of a list while `wanted`; an error stops it. */
export function useAllPages(list: PagedList, wanted: boolean): void {
  const { hasNextPage, isFetching, isError, fetchNextPage } = list;
  useEffect(() => {
    if (wanted && hasNextPage && !isFetching && !isError) fetchNextPage();
  }, [wanted, hasNextPage, isFetching, isError, fetchNextPage]);
}
