import { inject, Injectable } from '@angular/core';
import { Params, Router } from '@angular/router';

/** Keeps the view of a page in the query of its address, so that a link shows what I see. */
@Injectable({ providedIn: 'root' })
export class AddressQuery {
  private readonly router = inject(Router);

  /** Lays a part over the query; null takes a name out. The page neither scrolls nor gets an entry in the history. */
  patch(queryParams: Params): void {
    void this.router.navigate([], {
      queryParams,
      queryParamsHandling: 'merge',
      replaceUrl: true,
      scroll: 'manual',
    });
  }
}
