import useMediaQuery from '@mui/material/useMediaQuery';

/** True below 900 px, where the bottom bar stands in for the rail. */
export const usePhone = (): boolean => useMediaQuery('(max-width:899.95px)');

/** True below 1200 px, where a docked drawer would leave the page too little room. */
export const useNarrow = (): boolean => useMediaQuery('(max-width:1199.95px)');
