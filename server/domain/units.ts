export const metresToInches = (metres: number): number => metres / 0.0254;
export const celsiusToFahrenheit = (celsius: number): number => celsius * 1.8 + 32;
