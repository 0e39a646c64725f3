import { ChangeDetectionStrategy, Component } from '@angular/core';
import { type ComponentFixture, TestBed } from '@angular/core/testing';
import * as z from 'zod';
import type { Shape } from '#shared/measure/shape';
import { shapeSchema } from '#shared/measure/shape-schema';
import { signIn, words } from '../../test/sign-in';
import { documentForm } from '../core/forms/document-form';
import { firstShape } from './first-shape';
import { ShapeForm } from './shape-form';

@Component({
  selector: 'app-shape-host',
  imports: [ShapeForm],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `<app-shape-form path="shape" [form]="form" />`,
})
class ShapeHost {
  readonly form = documentForm(z.strictObject({ shape: shapeSchema }));
}

describe('What a shape form offers where one measures in inches', () => {
  let fixture: ComponentFixture<ShapeHost>;

  const element = () => fixture.nativeElement as HTMLElement;
  const shape = () => fixture.componentInstance.form.parsed()?.shape;
  const begin = (first: Shape) => {
    fixture.componentInstance.form.reset({ shape: first });
    fixture.detectChanges();
  };
  const press = (text: string) => {
    const found = [...element().querySelectorAll<HTMLElement>('button, label')].find((one) =>
      one.textContent?.trim().endsWith(text),
    );
    found?.click();
    fixture.detectChanges();
  };
  const choose = (text: string) => {
    const entry = [...element().querySelectorAll('select')].find((one) =>
      [...one.options].some((option) => option.textContent?.trim() === text),
    ) as HTMLSelectElement;
    entry.selectedIndex = [...entry.options].findIndex((option) => option.textContent?.trim() === text);
    entry.dispatchEvent(new Event('change'));
    fixture.detectChanges();
  };

  beforeEach(() => {
    TestBed.configureTestingModule({ providers: [words] });
    signIn(['owner'], { lengthUnit: 'in' });
    fixture = TestBed.createComponent(ShapeHost);
  });

  it('parts of a band of 20 in, curves of 8 in, stretches of 28 in', () => {
    begin(firstShape('band', 'in'));
    choose('part by part');
    press('Another part');
    choose('curve');
    press('Cut into stretches');
    const curve = { part: 'curve', radius_mm: 203.2, angle_degrees: 90 };
    const straight = { part: 'straight', length_mm: 508 };
    expect(shape()).toMatchObject({
      length: { by: 'parts', parts: [curve, curve, straight, curve, straight] },
      stretch_mm: 711.2,
    });
    choose('with a tape round it');
    expect(shape()).toMatchObject({ length: { by: 'tape', length_mm: 2006.6 } });
  });

  it('a square twist of 1 1/2 in across', () => {
    begin(firstShape('twisted', 'in'));
    choose('square');
    expect(shape()).toMatchObject({ section: { outline: 'square', across_mm: 38.1 } });
  });

  it('the next girth as far on as the last, the next corner 2 in to the left', () => {
    const stations = [
      { at_mm: 0, girth_mm: 200 },
      { at_mm: 63.5, girth_mm: 180 },
    ];
    begin({ ...firstShape('stations', 'in'), stations } as Shape);
    press('Another girth');
    expect(shape()).toMatchObject({ stations: [...stations, { at_mm: 127, girth_mm: 180 }] });
    const points = [
      { x_mm: 0, y_mm: 0 },
      { x_mm: 254, y_mm: 0 },
      { x_mm: 254, y_mm: 127 },
    ];
    begin({ kind: 'polygon', points });
    press('Another corner');
    expect(shape()).toMatchObject({ points: [...points, { x_mm: 203.2, y_mm: 127 }] });
  });

  it('flutes of 3/8 in, cut an eighth deep', () => {
    begin(firstShape('straight-leg', 'in'));
    press('Fluted, reeded or grooved');
    expect(shape()).toMatchObject({ fluting: { width_mm: 9.525, depth_mm: 3.175, between_mm: 3.175 } });
  });
});
