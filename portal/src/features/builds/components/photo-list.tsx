import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Typography from '@mui/material/Typography';
import type { Photo } from '../api/builds';

interface PhotoListProps {
  photos: readonly Photo[];
  /** Offers to take a photo back. */
  onTakeBack?: (photoId: string) => void;
  /** The first one large, the others beside it. */
  isLarge?: boolean;
}

/** Photos with their captions; each opens in full. */
export function PhotoList({ photos, onTakeBack, isLarge = false }: PhotoListProps) {
  if (photos.length === 0) return null;
  return (
    <Box
      sx={{
        display: 'grid',
        gridTemplateColumns: isLarge
          ? { xs: '1fr', sm: '1.6fr 1fr' }
          : 'repeat(auto-fill, minmax(120px, 1fr))',
        gap: '12px',
        py: '10px',
      }}
    >
      {photos.map(({ id, url, caption }, index) => (
        <Box
          key={id}
          component="figure"
          sx={{ m: 0, gridRow: isLarge && index === 0 ? 'span 2' : undefined }}
        >
          <Box component="a" href={url} target="_blank" rel="noreferrer">
            <Box
              component="img"
              src={url}
              alt={caption || 'Photo of the board'}
              loading="lazy"
              sx={{
                display: 'block',
                width: '100%',
                maxHeight: isLarge ? 300 : 110,
                objectFit: 'cover',
                border: '1px solid',
                borderColor: 'token.rule',
                borderRadius: '3px',
                backgroundColor: 'token.sunk',
              }}
            />
          </Box>
          <Box
            component="figcaption"
            sx={{ display: 'flex', alignItems: 'center', justifyContent: 'space-between' }}
          >
            <Typography variant="small" component="span">
              {caption}
            </Typography>
            {onTakeBack && (
              <Button
                size="small"
                variant="text"
                onClick={() => onTakeBack(id)}
                aria-label={`Take back ${caption || 'this photo'}`}
              >
                Take back
              </Button>
            )}
          </Box>
        </Box>
      ))}
    </Box>
  );
}
