/** What headings call each field, in the dialects of stock lists. Common practice, no source. Headings come folded. */
import { type ImportField } from './home-draft'

/** A pattern and how sure a heading that matches it makes us [10: no doubt, below 5: only with fitting content]. */
export type HeadingRule = readonly [RegExp, number]

const COUNT = String.raw`(?:(?:no|number|num|count|qty|total|open|outstanding|eicr|of|live|current|observation|obs|defect)s? )*`
const COUNTED = String.raw`(?: (?:no|count|qty|open|outstanding|obs|observations?|defects?|items?|codes?|total|s))*`
const counts = (code: string): readonly HeadingRule[] => [
  [new RegExp(`^${COUNT}(?:${code})s?${COUNTED}$`), 10],
]

/** Dates and outcomes of inspections are told apart in inspection-headings. */
export const HEADING_RULES: Partial<Record<ImportField, readonly HeadingRule[]>> = {
  reference: [
    [/^(?:property|prop|asset|home|unit|dwelling|place|house|stock|our|housing|internal|landlord|system|uh)s? ?(?:ref|reference|id|code|key|identifier)(?: no| number)?$/, 10],
    [/^(?:asset|stock|record|system) (?:no|number|num)$/, 9],
    [/^(?:ref|reference|id|code|ref no|reference no|reference number|prn|pref)$/, 8],
    [/^(?:property|prop|unit|home|dwelling) (?:no|number|num)$/, 6],
  ],
  uprn: [[/^(?:(?:os|nlpg|llpg|the) )?uprn(?: no| number| id| ref)?$|^u p r n$|^unique property ref(?:erence)?(?: no| number)?$/, 10]],
  kind: [[/^(?:kind|record type|supply(?: type)?|home or communal|dwelling or communal|asset kind)$/, 8]],
  block: [
    [/^block(?: name)?$/, 10],
    [/^(?:building|scheme|court|complex|sub building|development)(?: name)?$/, 7],
    [/^site(?: name)?$/, 4],
  ],
  number: [
    [/^(?:house|hse|door|flat|street|address|building|unit|plot|flat house|house flat|house or flat|paon|saon)s?(?: (?:no|num|number|nr))$/, 10],
    [/^(?:no|number|num|nr|paon|saon|door|flat|house name or number|house name number|house no name|name no|no name|h no|number name)$/, 9],
    [/^(?:property|prop|home|dwelling) (?:no|number|num)$/, 6],
    [/^(?:unit|house|plot)$/, 4],
  ],
  street: [[/^(?:street|road|st|rd)(?: name| address)?$|^thoroughfare(?: name)?$|^address street$|^road street$|^street road$/, 10]],
  address: [
    [/^(?:(?:full|whole|property|prop|postal|site|home|dwelling|unit|asset|tenant|tenanted|short|complete|rental) )?(?:address|addr|add)(?: full| in full)?$/, 10],
    [/^(?:property|premises|location|home|dwelling|house|unit|rental|where|property name|name of property)$/, 4],
  ],
  town: [[/^(?:post(?:al)? ?)?town(?: city)?$|^city(?: town)?$|^village$|^address town$|^town name$|^town or city$|^town village$/, 10], [/^locality$/, 5]],
  postcode: [[/^(?:property |full |home )?(?:post ?code|p ?code|post cd|postal code|p c|pc|zip(?: code)?)$/, 10]],
  patch: [
    [/^(?:housing |officer )?patch(?: name| code)?$/, 10],
    [/^neighbou?rhood(?: name| area)?$/, 8],
    [/^(?:housing |management |managing |local |patch )?area(?: name)?$|^estate(?: name)?$/, 7],
    [/^(?:ward|district|locality|zone|cluster|housing team|team|housing officer|neighbou?rhood officer)(?: name)?$/, 5],
    [/^region$/, 4],
  ],
  nation: [[/^(?:nation|country|home nation|jurisdiction)$/, 9]],
  tenure: [[/^tenure(?: type| desc| description)?$/, 10], [/^(?:tenancy|rent|let|letting|occupancy|occupation|contract|lease) ?type$|^tenancy$/, 6]],
  built: [
    [/^(?:yr|year|date) (?:of )?(?:built|build|construct\w*)$|^(?:built|build|construct(?:ion|ed)?)(?: (?:in|yr|year|date|period|era))?$/, 10],
    [/^(?:property|prop|building|dwelling|home) (?:age|era)(?: band)?$|^age band$|^construction age(?: band)?$|^approx (?:year|age|build).*$/, 8],
    [/^(?:age|era|vintage|year|yr)$|^age of (?:property|home|dwelling|building)$/, 5],
  ],
  'dwelling-type': [
    [/^(?:property|prop|dwelling|house|home|unit|accommodation|building) ?(?:type|archetype|form|style)(?: desc\w*)?$/, 10],
    [/^archetype$|^built ?form$|^type of (?:property|dwelling|home|house)$/, 9],
    [/^(?:type|form|style|asset type|property|dwelling|description)$/, 5],
  ],
  bedrooms: [[/^(?:(?:no|number|num|nr|total)(?: of)? )?(?:beds?|bed ?rooms?|bdrms?|br)(?: no| number| count)?$/, 10]],
  'board-type': [
    [/\bfuse ?(?:board|box)\b|\bconsumer (?:unit|control unit)\b|\bdistribution board\b|^c ?c? ?u(?: type)?$|^d ?b(?: type)?$|^(?:type of )?(?:fuse|board)s?(?: type| kind)?$/, 9],
    [/^(?:circuit )?protect(?:ion|ive)(?: type| devices?)?$|^(?:electrical )?protection$|^type of (?:cu|ccu|db|protection)$|^(?:elec\w* )?board\b|^mcbs?(?: board)?$|^overcurrent.*$/, 7],
  ],
  'rcd-cover': [[/^(?:30 ?ma )?rcds?(?: (?:yn|y n|fitted|present|protect(?:ion|ed)|cover(?:age)?|installed|provision|type|30ma))*$|^rcd rcbo$|^residual current.*$|^additional protection$/, 10], [/\brcds?\b/, 6]],
  ways: [[/^(?:ways|board ways|way letters|board strip)$/, 10]],
  wiring: [[/^(?:wiring|cable|cabling|type of wiring|type of cable)(?: (?:type|system|kind|material|insulation))?$|^(?:wiring )?insulation(?: type)?$/, 9]],
  rewired: [[/^(?:(?:last|full|date|year|yr|when|fully|of|the) )*re ?wir(?:e|ed|ing)(?: (?:date|year|yr|in|on|completed|done))*$/, 10]],
  'open-c1': counts('c ?1|code ?1|danger present'),
  'open-c2': counts('c ?2|code ?2|potentially dangerous'),
  'open-c3': counts('c ?3|code ?3|improvement recommended'),
  'open-fi': counts('fi|f i|further inv\\w*'),
  easting: [[/^(?:os |osgb |bng |grid |gis )?(?:easting|eastings|east)$/, 10], [/^(?:os |osgb |bng |grid |gis |geo |map )*x(?: ?co ?ord\w*)?$|^co ?ord\w* x$|^e$/, 8]],
  northing: [[/^(?:os |osgb |bng |grid |gis )?(?:northing|northings|north)$/, 10], [/^(?:os |osgb |bng |grid |gis |geo |map )*y(?: ?co ?ord\w*)?$|^co ?ord\w* y$|^n$/, 8]],
  'grid-reference': [[/^(?:os |national |osgb |uk )*grid ?ref(?:erence)?$|^ngr$|^osgr$|^os ref(?:erence)?$/, 10]],
  latitude: [[/^(?:gps |geo )?lat(?:itude)?$/, 10], [/^(?:gps |geo |map )*y(?: ?co ?ord\w*)?$/, 7]],
  longitude: [[/^(?:gps |geo )?(?:long?(?:itude)?|lng)$/, 10], [/^(?:gps |geo |map )*x(?: ?co ?ord\w*)?$/, 7]],
  note: [
    [/^(?:notes?|comments?|remarks?|note s)$/, 10],
    [/^(?:general |other |additional |further |any |property )*(?:notes?|comments?|remarks?|info(?:rmation)?|memo)$/, 7],
  ],
} // prettier-ignore
