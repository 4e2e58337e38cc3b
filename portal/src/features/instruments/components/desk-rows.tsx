import Box from '@mui/material/Box';
import ButtonBase from '@mui/material/ButtonBase';
import type { ReactNode } from 'react';
import { AssetTag } from '../../../shared-ui/asset-tag';
import type { Instrument } from '../api/instruments';

interface DeskRowProps {
  instrument: Instrument;
  isOpen: boolean;
  end: ReactNode;
  line: ReactNode;
  onOpen: () => void;
}

/** A row of the desk: tag, name, state, and a line of what there is to know; it opens the instrument. */
export function DeskRow({ instrument, isOpen, end, line, onOpen }: DeskRowProps) {
  return (
    <ButtonBase
      onClick={onOpen}
      aria-expanded={isOpen}
      sx={{
        display: 'grid',
        gridTemplateColumns: '74px 1fr auto',
        columnGap: '10px',
        width: '100%',
        minHeight: 52,
        py: '8px',
        alignItems: 'start',
        textAlign: 'left',
        typography: 'body1',
        borderBottom: '1px solid',
        borderColor: 'token.rule',
        ...(isOpen && { backgroundColor: 'token.sheet', outline: '1.5px solid', outlineColor: 'token.ink' }),
      }}
    >
      <span>
        <AssetTag>{instrument.tag}</AssetTag>
      </span>
      <b>{instrument.name}</b>
      {end}
      <Box component="span" sx={{ gridColumn: '2 / -1', typography: 'small', color: 'token.ink2' }}>
        {line}
      </Box>
    </ButtonBase>
  );
}
