import type { Provider } from '@angular/core';
import {
  MAT_FORM_FIELD_DEFAULT_OPTIONS,
  type MatFormFieldDefaultOptions,
} from '@angular/material/form-field';

const options: MatFormFieldDefaultOptions = {
  appearance: 'outline',
  subscriptSizing: 'dynamic',
  hideRequiredMarker: true,
};

/** How every form field looks. */
export const formFieldDefaults: Provider = {
  provide: MAT_FORM_FIELD_DEFAULT_OPTIONS,
  useValue: options,
};
