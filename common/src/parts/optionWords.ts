import type { Technology } from './technology.js';
import type { Approval, InputType, Lifecycle, Origin } from './vocabulary.js';

/** Other words by which lists mean an option, in English, German and French. */
export type OptionWords<Option extends string> = Readonly<Record<Option, readonly string[]>>;

/** “End of life” and “abgekündigt” announce the end: until then the part can be bought a last time. */
const LIFECYCLE_WORDS: OptionWords<Lifecycle> = {
  active: ['aktiv', 'actif', 'in production', 'production', 'in Produktion', 'en production', 'lieferbar'],
  'not-recommended': [
    'NRND',
    'not recommended',
    'not for new designs',
    'nicht empfohlen',
    'nicht für Neuentwicklungen',
    'nicht für neue Entwicklungen',
    'non recommandé',
    'non recommandé pour les nouvelles conceptions',
  ],
  'last-time-buy': [
    'LTB',
    'last buy',
    'EOL',
    'end of life',
    'abgekündigt',
    'letzte Bestellung',
    'dernière commande',
    'dernier achat',
    'fin de vie',
  ],
  obsolete: ['obsolet', 'obsolète', 'discontinued', 'eingestellt', 'nicht mehr lieferbar', 'arrêté'],
};

const APPROVAL_WORDS: OptionWords<Approval> = {
  approved: ['yes', 'ja', 'oui', 'released', 'freigegeben', 'homologué', 'approuvé'],
  restricted: [
    'limited',
    'conditional',
    'eingeschränkt',
    'eingeschränkt freigegeben',
    'bedingt',
    'restreint',
  ],
  'not-approved': [
    'no',
    'nein',
    'non',
    'not released',
    'blocked',
    'nicht freigegeben',
    'gesperrt',
    'non homologué',
    'non approuvé',
    'interdit',
  ],
};

const INPUT_TYPE_WORDS: OptionWords<InputType> = {
  bipolar: ['BJT', 'bipolaire'],
  jfet: ['FET', 'JFET input', 'JFET-Eingang'],
  cmos: ['MOS', 'MOSFET'],
  'zero-drift': ['chopper', 'chopper-stabilised', 'chopper-stabilized', 'auto-zero', 'dérive nulle'],
};

const TECHNOLOGY_WORDS: OptionWords<Technology> = {
  'metal-foil': ['foil', 'bulk metal foil', 'Metallfolie', 'feuille métallique'],
  'thin-film': ['Dünnschicht', 'Dünnfilm', 'couche mince', 'film mince'],
  'metal-film': ['Metallschicht', 'Metallfilm', 'couche métallique', 'film métallique'],
  wirewound: ['wire', 'Draht', 'drahtgewickelt', 'Drahtwiderstand', 'bobiné', 'fil bobiné'],
  'thick-film': ['Dickschicht', 'Dickfilm', 'couche épaisse', 'film épais'],
  'carbon-film': ['Kohleschicht', 'Kohlefilm', 'couche de carbone', 'couche carbone', 'film de carbone'],
  'carbon-composition': ['carbon comp', 'carbon composite', 'Kohlemasse', 'carbone aggloméré'],
};

export const ORIGIN_WORDS: OptionWords<Origin> = {
  typical: ['typ', 'typisch', 'typique'],
  maximum: ['max', 'maximal'],
  measured: ['gemessen', 'mesuré'],
  estimated: ['geschätzt', 'estimé'],
};

/** The words of each field that is a choice, by the field’s key. */
export const FIELD_OPTION_WORDS: Readonly<Record<string, OptionWords<string>>> = {
  lifecycle: LIFECYCLE_WORDS,
  approval: APPROVAL_WORDS,
  inputType: INPUT_TYPE_WORDS,
  technology: TECHNOLOGY_WORDS,
};
