import Box from '@mui/material/Box';
import { memo } from 'react';
import { NavLink, useLocation } from 'react-router-dom';
import { token } from '../../../shared-ui/tokens';
import { useKeptSearch } from '../inputs/kept-inputs';
import { FAMILIES, familyPath, type Family } from './families';

const LINK = {
  flex: 'none',
  display: 'inline-flex',
  alignItems: 'center',
  height: 44,
  color: token('ink2'),
  textDecoration: 'none',
  whiteSpace: 'nowrap',
  borderBottom: '3px solid transparent',
  '&:hover': { color: token('ink') },
  '&[aria-current="page"]': { color: token('ink'), fontWeight: 700, borderBottomColor: token('green') },
} as const;

function FamilyLink({ family, name }: { family: Family; name: string }) {
  // What is kept is written together with the address.
  useLocation();
  const search = useKeptSearch(family);
  return (
    <Box component={NavLink} to={`${familyPath(family)}${search}`} sx={LINK}>
      {name}
    </Box>
  );
}

/** The families as a row of words; each opens with what was last typed there. */
export const FamilyRow = memo(function FamilyRow() {
  return (
    <Box
      component="nav"
      aria-label="Families of calculators"
      sx={{
        display: { xs: 'none', md: 'flex' },
        gap: '0 26px',
        flexWrap: 'wrap',
        borderBottom: `1px solid ${token('rule')}`,
      }}
    >
      {FAMILIES.map(({ path, name }) => (
        <FamilyLink key={path} family={path} name={name} />
      ))}
    </Box>
  );
});
