import type { Theme } from '@mui/material/styles';
import useMediaQuery from '@mui/material/useMediaQuery';

/** True below 900 px, where the bottom bar stands in for the rail. */
export const usePhone = (): boolean => useMediaQuery<Theme>((theme) => theme.breakpoints.down('md'));
