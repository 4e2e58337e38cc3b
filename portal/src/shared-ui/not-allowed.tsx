import type { ReactNode } from 'react';
import { Banner } from './banner';
import { PageTitle } from './page-title';

interface NotAllowedProps {
  /** The page's name: "Treasury". */
  page: string;
  /** Who it is for: "Treasury is for treasurers." */
  forWhom: string;
  /** Where the person's own version is, and whom to ask. */
  children: ReactNode;
}

/** In place of a page the person may not open. */
export function NotAllowed({ page, forWhom, children }: NotAllowedProps) {
  return (
    <>
      <PageTitle tab={page}>
        <b>{page}</b>
      </PageTitle>
      <Banner kind="not allowed" title={forWhom}>
        {children}
      </Banner>
    </>
  );
}
