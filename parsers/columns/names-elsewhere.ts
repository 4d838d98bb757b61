import type { NameEntry } from './names';

/** German, French, Spanish, Italian, Dutch, Portuguese. */
export const ELSEWHERE: readonly NameEntry[] = [
  [
    'id',
    1,
    'vorgangsnummer|vorgangs nr|vorgang nr|vorgangsnr|vorgang id|vorgangs id|kennung|kennziffer|aufgaben nr|vorgangscode',
  ],
  [
    'id',
    1,
    'id tache|no tache|numero de tache|code tache|code activite|id activite|numero d activite|identifiant|n tache|repere',
  ],
  [
    'id',
    1,
    'id tarea|id actividad|codigo|codigo actividad|codigo de actividad|n actividad|identificador|id attivita|codice|codice attivita|id activiteit|activiteitnr|taak id|taaknr|activiteit id|id da tarefa|id tarefa',
  ],
  ['id', 0.75, 'lfd nr|lfdnr|numero|nummer|cod|n'],
  [
    'id',
    0.6,
    'vorgang|aufgabe|tache|activite|actividad|tarea|attivita|activiteit|taak|atividade|tarefa|arbeitsgang',
  ],
  [
    'name',
    1,
    'bezeichnung|beschreibung|vorgangsname|vorgangsbezeichnung|benennung|designation|libelle|nom|nom de la tache|intitule|descripcion|nombre|nombre de la tarea|descrizione|nome|denominazione|omschrijving|naam|beschrijving|descricao|nome da tarefa|nombre de tarea',
  ],
  [
    'name',
    0.8,
    'vorgang|aufgabe|tache|activite|actividad|tarea|attivita|activiteit|taak|atividade|tarefa|arbeitsgang|tatigkeit|leistung',
  ],
  [
    'optimistic',
    1,
    'optimistisch|optimistische dauer|optimiste|duree optimiste|optimista|duracion optimista|tiempo optimista|ottimistica|durata ottimistica|ottimistico|otimista|minimal|minimo|minimale',
  ],
  [
    'likely',
    1,
    'wahrscheinlich|am wahrscheinlichsten|wahrscheinlichste dauer|wahrscheinlichste|haufigste|plus probable|vraisemblable|duree probable|mas probable|probabile|piu probabile|durata probabile|duracion probable|waarschijnlijk|meest waarschijnlijk|mais provavel|realistisch|realiste|realista|normal dauer',
  ],
  [
    'pessimistic',
    1,
    'pessimistisch|pessimistische dauer|pessimiste|duree pessimiste|pesimista|duracion pesimista|tiempo pesimista|pessimistica|durata pessimistica|pessimistico|pessimista|maximal|massimo|maximo|maximale',
  ],
  [
    'duration',
    1,
    'dauer|vorgangsdauer|duree|duracion|durata|duur|duracao|dauer in tagen|duree en jours|arbeitstage|tage',
  ],
  ['duration', 0.8, 'jours|dias|dagen|giorni|plazo|delai'],
  [
    'predecessors',
    1,
    'vorganger|vorgaenger|vorgangernr|vorganger nr|predecesseur|predecesseurs|antecedent|antecedents|anteriorite|anteriorites|tache precedente|taches precedentes|predecesor|predecesora|predecesores|predecesoras|precedente|precedentes|precedencia|precedencias|actividad precedente|actividades precedentes|predecessore|predecessori|precedenza|precedenze|attivita precedente|attivita precedenti|voorganger|voorgangers|predecessora|predecessoras|antecessora|antecessoras|abhangig von|depend de|dipende da|depende de|nach',
  ],
  [
    'successors',
    1,
    'nachfolger|successeur|successeurs|sucesor|sucesora|sucesores|sucesoras|successore|successori|opvolger|opvolgers|sucessora|sucessoras|folgt',
  ],
  [
    'relation',
    1,
    'anordnungsbeziehung|beziehung|aob|lien|type de lien|relacion|tipo de relacion|relazione|tipo di relazione|tipo relazione|relatie',
  ],
  ['relation', 0.6, 'tipo|art'],
  ['lag', 1, 'zeitabstand|abstand|decalage|desfase|retardo|ritardo|vertraging|wartezeit'],
  ['wbs', 1, 'psp|psp code|psp nr|psp element|otp|edt|wps'],
  ['calendar', 1, 'kalender|calendrier|calendario'],
  [
    'resource',
    1,
    'ressource|ressourcen|ressources|recurso|recursos|risorsa|risorse|kolonne|equipe|cuadrilla',
  ],
  [
    'responsible',
    1,
    'verantwortlich|zustandig|responsable|responsabile|verantwoordelijk|verantwoordelijke|responsavel',
  ],
  [
    'start',
    1,
    'anfang|beginn|debut|date de debut|inicio|fecha de inicio|comienzo|inizio|data inizio|begin datum|startdatum',
  ],
  [
    'finish',
    1,
    'ende|fin|date de fin|fecha de fin|fecha fin|fine|data fine|einde|einddatum|enddatum|termino',
  ],
  ['totalFloat', 1, 'gesamtpuffer|puffer|gp|marge|marge totale|holgura|holgura total|margine|speling|folga'],
  ['critical', 1, 'kritisch|critique|critica|critico|kritiek'],
  [
    'notes',
    1,
    'bemerkung|bemerkungen|anmerkung|anmerkungen|hinweis|remarque|remarques|commentaire|commentaires|observaciones|notas|nota|osservazioni|opmerking|opmerkingen|observacoes',
  ],
];
