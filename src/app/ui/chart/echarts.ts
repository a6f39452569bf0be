import { CustomChart, LineChart, ScatterChart } from 'echarts/charts';
import { GridComponent, MarkAreaComponent, MarkLineComponent } from 'echarts/components';
import { init, use } from 'echarts/core';
import { CanvasRenderer } from 'echarts/renderers';

use([CanvasRenderer, CustomChart, GridComponent, LineChart, MarkAreaComponent, MarkLineComponent, ScatterChart]);

// NOTE: loaded lazily through chart-engine.ts; nothing else may import the drawing library's code (types are free).
export { init };
