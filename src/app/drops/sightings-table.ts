import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { RouterLink } from '@angular/router';
import type { DropView } from '@shared/contracts/drops';
import { FrequencyPipe } from '../ui/frequency';
import { MarginValue } from '../ui/margin-value';
import { SignedDecibelsPipe } from '../ui/signed-decibels';
import { marginScale } from './margin-scale';
import { MarginSlide } from './margin-slide';
import { ownerQuery } from './owner-query';
import { buildName, marginBeforeDb } from './sighting-words';

/** Every build that shows the loss, oldest first, with what is left in each. */
@Component({
  selector: 'app-sightings-table',
  imports: [FrequencyPipe, MarginSlide, MarginValue, RouterLink, SignedDecibelsPipe],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <div class="table-frame">
      <table class="dense-table">
        <caption class="visually-hidden">
          Builds that show the loss
        </caption>
        <thead>
          <tr>
            <th scope="col">Build</th>
            <th scope="col" class="number">Left to the limit</th>
            <th scope="col" class="slide">From where to where</th>
            <th scope="col" class="number">Change</th>
            <th scope="col" class="number">At</th>
          </tr>
        </thead>
        <tbody>
          @for (row of rows(); track row.buildId) {
            <tr>
              <td>
                <a
                  [routerLink]="['/t', teamKey(), 'products', drop().product, 'builds', row.buildId]"
                  [queryParams]="owner()"
                  >{{ row.name }}</a
                >
                <span class="part muted small">{{ row.part }}</span>
              </td>
              <td class="number">
                <app-margin-value [marginDb]="row.marginDb" [targetMarginDb]="targetDb()" />
              </td>
              <td class="slide">
                <app-margin-slide
                  [beforeDb]="row.beforeDb"
                  [nowDb]="row.marginDb"
                  [targetMarginDb]="targetDb()"
                  [scale]="scale()"
                />
              </td>
              <td class="number">{{ row.differenceDb | signedDecibels }}</td>
              <td class="number">{{ row.frequencyHz | frequency }}</td>
            </tr>
          }
          @if (drop().noLongerSeenIn; as build) {
            <tr>
              <td>
                <a
                  [routerLink]="['/t', teamKey(), 'products', drop().product, 'builds', build.id]"
                  [queryParams]="owner()"
                  >{{ build.hardware }} / {{ build.firmware }}</a
                >
              </td>
              <td colspan="4">the margin is back</td>
            </tr>
          }
        </tbody>
      </table>
    </div>
  `,
  styles: `
    .table-frame {
      position: relative;
      max-width: 900px;
    }
    .part {
      margin-inline-start: 8px;
    }
    .slide {
      min-width: 180px;
    }
    @media (max-width: 719px) {
      .slide {
        display: none;
      }
    }
  `,
})
export class SightingsTable {
  readonly drop = input.required<DropView>();
  readonly teamKey = input.required<string>();

  protected readonly owner = computed(() => ownerQuery(this.drop(), this.teamKey()));
  protected readonly targetDb = computed(() => this.drop().evidence.targetMarginDb);
  protected readonly rows = computed(() => {
    const { buildId, latest, seenIn } = this.drop();
    return seenIn.map((sighting) => ({
      ...sighting,
      name: buildName(sighting),
      beforeDb: marginBeforeDb(sighting),
      part:
        sighting.buildId === buildId
          ? 'raised it'
          : sighting.buildId === latest.buildId
            ? 'the latest that shows it'
            : '',
    }));
  });
  protected readonly scale = computed(() =>
    marginScale([this.targetDb(), ...this.rows().flatMap(({ marginDb, beforeDb }) => [marginDb, beforeDb])]),
  );
}
