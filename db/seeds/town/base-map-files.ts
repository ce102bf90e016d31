import { type BaseMap, baseMap } from './base-map'
import { town } from './town'

/**
 * The files of public/base-map: their names and their text.
 * @example baseMapFiles()[0][0] // 'ground.geojson'
 */
export const baseMapFiles = (): [name: string, text: string][] =>
  (Object.entries(baseMap(town())) as [keyof BaseMap, BaseMap[keyof BaseMap]][]).map(([name, collection]) => [
    `${name}.geojson`,
    // a line a feature: git shows what changed
    JSON.stringify(collection).replaceAll('{"type":"Feature",', '\n{"type":"Feature",') + '\n',
  ])
