import Box from '@mui/material/Box';
import { formatAmount } from '../../../lib/money';
import { AssetTag } from '../../../shared-ui/asset-tag';
import { VisuallyHidden } from '../../../shared-ui/visually-hidden';
import type { BookItem } from '../api/treasury';
import { ROW } from '../wires';

interface BookRowsProps {
  books: readonly BookItem[];
  /** The opened line, whose place in the books is framed. */
  openedId: string | undefined;
  chosenIds: ReadonlySet<string>;
  /** Left out when the opened line cannot take more. */
  onChoose: ((item: BookItem) => void) | undefined;
}

const rowKey = ({ kind, id, lineId }: BookItem, index: number): string =>
  `${kind}:${id}:${lineId ?? 'open'}:${index}`;

/** The books' side: what lines were matched to, then what is still open. An open one can be chosen for the opened line. */
export function BookRows({ books, openedId, chosenIds, onChoose }: BookRowsProps) {
  return (
    <Box component="ul" aria-label="In the books" sx={{ m: 0, p: 0, listStyle: 'none' }}>
      {books.map((item, index) => {
        const isOpen = item.lineId === null;
        const isChosen = isOpen ? chosenIds.has(item.id) : item.lineId === openedId;
        const canChoose = isOpen && onChoose !== undefined;
        return (
          <Box component="li" key={rowKey(item, index)}>
            <Box
              {...(canChoose
                ? {
                    component: 'button' as const,
                    type: 'button' as const,
                    'aria-pressed': isChosen,
                    onClick: () => onChoose(item),
                  }
                : {})}
              sx={rowStyle(isChosen, canChoose)}
            >
              <span>
                <AssetTag>{item.tag}</AssetTag>
              </span>
              <Cell isBold={isOpen}>{item.name}</Cell>
              <Cell isSmall>{item.detail}</Cell>
              <Box component="span" sx={{ fontWeight: isOpen ? 700 : 400, textAlign: 'right' }}>
                {formatAmount(item.amountMinor)}
              </Box>
              <VisuallyHidden>{isOpen ? 'open' : 'matched'}</VisuallyHidden>
            </Box>
          </Box>
        );
      })}
    </Box>
  );
}

interface CellProps {
  children: string;
  isBold?: boolean;
  isSmall?: boolean;
}

const Cell = ({ children, isBold = false, isSmall = false }: CellProps) => (
  <Box
    component="span"
    sx={{
      minWidth: 0,
      fontSize: isSmall ? '0.78125rem' : 'inherit',
      overflow: 'hidden',
      textOverflow: 'ellipsis',
      whiteSpace: 'nowrap',
      fontWeight: isBold ? 700 : 400,
      color: isBold ? 'token.ink' : 'token.ink2',
    }}
  >
    {children}
  </Box>
);

const rowStyle = (isChosen: boolean, canChoose: boolean) => ({
  position: 'relative',
  display: 'grid',
  gridTemplateColumns: { xs: 'auto minmax(0, 1fr) auto', md: '78px minmax(0, 1fr) minmax(0, 1.3fr) 74px' },
  alignItems: 'center',
  gap: '8px',
  width: '100%',
  height: { md: ROW },
  minHeight: ROW,
  p: { xs: '0 8px', md: '0 0 0 10px' },
  fontSize: '0.84375rem',
  border: 0,
  borderBottom: '1px solid',
  borderColor: 'token.rule',
  background: 'none',
  color: 'token.ink',
  font: 'inherit',
  textAlign: 'left',
  '& > :nth-of-type(3)': { display: { xs: 'none', md: 'block' } },
  ...(canChoose && { cursor: 'pointer', '&:hover': { backgroundColor: 'token.sunk' } }),
  ...(isChosen && {
    '&, &:hover': { backgroundColor: 'token.sheet' },
    outline: '1.5px solid',
    outlineColor: 'token.ink',
    outlineOffset: '-1.5px',
    width: { xs: '100%', md: 'calc(100% + 10px)' },
    pr: { md: '10px' },
  }),
});
