import * as z from 'zod';

import rasters from '../../datasets/rasters.json' with { type: 'json' };
import type { Page, PageQuery } from '../../shared/contracts/paging.ts';
import { type SuppliedRaster, suppliedRaster } from '../../shared/contracts/raster.ts';

const supplied = z.array(suppliedRaster).parse(rasters);

/** The rasters that come with the product, to begin a region with. */
export const suppliedRasters = ({ page, pageSize }: PageQuery): Page<SuppliedRaster> => ({
  items: supplied.slice((page - 1) * pageSize, page * pageSize),
  total: supplied.length,
});
