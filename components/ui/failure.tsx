'use client';

import { AppError } from '@/lib/errors';
import { Button } from './button';
import { Notice } from './notice';

/** What happened, what is safe, and what to do, for something that could not be loaded. */
export function Failure({ error, what, onRetry }: { error: Error; what: string; onRetry?: () => void }) {
  const refused = error instanceof AppError;
  return (
    <div className="max-w-xl p-6">
      <Notice tone="danger" role="alert" title={`The ${what} could not be loaded`}>
        <p>
          {refused ? error.message : 'The server could not be reached, or did not answer as it should.'}{' '}
          {refused ? '' : 'Nothing that was saved is lost.'}
        </p>
        {onRetry && !(refused && error.code === 'not_found') ? (
          <Button size="small" className="mt-2" onClick={onRetry}>
            Try again
          </Button>
        ) : null}
      </Notice>
    </div>
  );
}
