import type { CaseSigned } from '../../domain/api.ts';

const when = (instant: string) =>
  new Date(instant).toLocaleString('en-GB', { dateStyle: 'long', timeStyle: 'short', timeZone: 'UTC' });

/** That the note is signed, how to verify it, and where its document is. */
export const SignedBar = ({ signed }: { signed: CaseSigned }) => (
  <div className="case-bar case-bar-good" role="status">
    <span>
      Signed as version {signed.version}, {when(signed.signedAt)} UTC. Verification code{' '}
      <strong>{signed.verificationCode}</strong>.
    </span>
    <a href={`/api/signed/${signed.signedVersionId}/note.docx`}>Document (DOCX)</a>
    <a href={`/signed/${signed.signedVersionId}`}>Add to the note</a>
    <a href="/">Back to the theatre list</a>
  </div>
);
