import { ChangeDetectionStrategy, Component } from '@angular/core';
import { RouterOutlet } from '@angular/router';
import { PageFailed } from './states/page-failed';

@Component({
  selector: 'ss-root',
  imports: [PageFailed, RouterOutlet],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: '<ss-page-failed /><router-outlet />',
})
export class App {}
