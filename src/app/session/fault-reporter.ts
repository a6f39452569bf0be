import { HttpErrorResponse } from '@angular/common/http';
import { ErrorHandler, inject, Injectable, Injector } from '@angular/core';
import { MatSnackBar } from '@angular/material/snack-bar';

/** Tells the person that something broke that no page expected, and writes the fault to the console. */
@Injectable()
export class FaultReporter implements ErrorHandler {
  private readonly injector = inject(Injector);

  handleError(error: unknown): void {
    console.error(error);
    // NOTE: the snack bar is fetched late because the error handler is built before everything else.
    const message =
      error instanceof HttpErrorResponse && error.status === 0
        ? 'The server did not answer. What you typed is still here; try again in a moment.'
        : 'Something went wrong on this page. What was saved stays saved; reload the page to go on.';
    this.injector.get(MatSnackBar).open(message, 'Close', { duration: 10_000 });
  }
}
