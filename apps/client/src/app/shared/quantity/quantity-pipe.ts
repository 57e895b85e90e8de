import { Pipe, type PipeTransform } from '@angular/core';
import { quantityText } from './quantity-text';

/** A number with its unit, or a dash where there is none. */
@Pipe({ name: 'quantity' })
export class QuantityPipe implements PipeTransform {
  transform(value: number | null | undefined, unit: string, digits = 1): string {
    return quantityText(value, unit, digits);
  }
}
