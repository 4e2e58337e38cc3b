import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Typography from '@mui/material/Typography';
import { useEffect, useMemo, useRef, useState } from 'react';
import { carryOut } from '../../../api-client/carry-out';
import { TextField } from '../../../shared-ui/fields/text-field';
import { Icon } from '../../../shared-ui/icon';
import { ProblemAlert } from '../../../shared-ui/problem-alert';
import { useToast } from '../../../shared-ui/toasts';
import { useAddPhoto, useTakeBackPhoto, type BuildCheck } from '../api/builds';
import { PhotoList } from './photo-list';

const MOST_BYTES = 6 * 1024 * 1024;
const KINDS = ['image/jpeg', 'image/png', 'image/webp'];

/** What is wrong with a file before it is sent; the server looks at it again. */
function whyNot(file: File): string | undefined {
  if (!KINDS.includes(file.type)) return 'A photo is a JPEG, PNG or WebP picture.';
  if (file.size > MOST_BYTES)
    return `The picture has ${Math.ceil(file.size / 1024 / 1024)} MB; 6 MB is the most.`;
  return undefined;
}

/** The picture as it will be sent, gone from memory when another is chosen. */
function usePreview(file: File | undefined): string | undefined {
  const url = useMemo(() => (file ? URL.createObjectURL(file) : undefined), [file]);
  useEffect(() => () => (url ? URL.revokeObjectURL(url) : undefined), [url]);
  return url;
}

/** A photo check, open: choose or take a picture, look at it, keep it. */
export function PhotoCard({ buildId, check }: { buildId: string; check: BuildCheck }) {
  const [file, setFile] = useState<File>();
  const [caption, setCaption] = useState('');
  const input = useRef<HTMLInputElement>(null);
  const preview = usePreview(file);
  const adding = useAddPhoto(buildId, check.id);
  const takingBack = useTakeBackPhoto(buildId);
  const say = useToast();
  const problem = file && whyNot(file);
  const keep = () => {
    if (!file || problem) return;
    carryOut(
      adding,
      { file, caption },
      {
        onSuccess: () => {
          setFile(undefined);
          setCaption('');
          say('Photo kept.');
        },
      },
    );
  };
  return (
    <Box>
      <PhotoList photos={check.photos} onTakeBack={(photoId) => takingBack.mutate(photoId)} />
      <input
        ref={input}
        type="file"
        accept={KINDS.join(',')}
        aria-label={`Picture for ${check.title}`}
        onChange={(event) => {
          adding.reset();
          setFile(event.target.files?.[0]);
        }}
        style={{ position: 'absolute', opacity: 0, width: 1, height: 1 }}
        tabIndex={-1}
      />
      {file && !problem && preview && (
        <Box sx={{ display: 'grid', gap: '10px', my: '10px' }}>
          <Box
            component="img"
            src={preview}
            alt="The picture you chose"
            sx={{ maxWidth: '100%', maxHeight: 260, borderRadius: '3px' }}
          />
          <TextField
            label="What it shows"
            value={caption}
            onChange={setCaption}
            maxLength={120}
            placeholder="Finished board, top"
          />
        </Box>
      )}
      {problem && (
        <Typography role="alert" variant="small" component="p" sx={{ color: 'token.oxide' }}>
          {problem} Nothing was sent.
        </Typography>
      )}
      {adding.isError && <ProblemAlert title="The photo was not sent." error={adding.error} onRetry={keep} />}
      {takingBack.isError && <ProblemAlert error={takingBack.error} />}
      <Box sx={{ display: 'flex', flexWrap: 'wrap', gap: '8px', mt: '8px' }}>
        {file && !problem && (
          <Button variant="contained" onClick={keep} loading={adding.isPending}>
            Keep this photo
          </Button>
        )}
        <Button startIcon={<Icon name="camera" />} onClick={() => input.current?.click()}>
          {file ? 'Choose another' : check.photos.length > 0 ? 'Add another photo' : 'Take or choose a photo'}
        </Button>
      </Box>
    </Box>
  );
}
