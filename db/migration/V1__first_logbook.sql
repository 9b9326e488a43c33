-- The first logbook. Runs on H2 and PostgreSQL alike: no reserved names, no expression or partial
-- index, no dialect of either. Words stand for kinds, never numbers. Lengths in millimetres, gauges
-- in inches, unit mass in grams per metre, cents positive when sharp. Limits are generous, and what
-- does not fit is refused, never cut.

-- Every change, in the order it was made; doing these rows again gives everything below.
CREATE TABLE action (
  sequence     BIGINT NOT NULL,
  done_at      TIMESTAMP(6) WITH TIME ZONE NOT NULL,
  technician   VARCHAR(1000) NOT NULL,
  name         VARCHAR(100) NOT NULL,
  form         INTEGER NOT NULL,
  values_json  VARCHAR(1000000) NOT NULL,
  CONSTRAINT action_key PRIMARY KEY (sequence)
);

-- One row at most, number 1.
CREATE TABLE shop (
  id                      INTEGER NOT NULL,
  version                 INTEGER NOT NULL,
  name                    VARCHAR(1000) NOT NULL,
  length_unit             VARCHAR(40) NOT NULL,
  reference_hz            DOUBLE PRECISION NOT NULL,
  breaking_share_percent  DOUBLE PRECISION NOT NULL,
  demo                    BOOLEAN NOT NULL,
  CONSTRAINT shop_key PRIMARY KEY (id),
  CONSTRAINT shop_single CHECK (id = 1)
);

CREATE TABLE shop_technician (
  shop_id  INTEGER NOT NULL,
  item     INTEGER NOT NULL,
  name     VARCHAR(1000) NOT NULL,
  CONSTRAINT shop_technician_key PRIMARY KEY (shop_id, item),
  CONSTRAINT shop_technician_shop FOREIGN KEY (shop_id) REFERENCES shop (id)
);

-- search_key: what people look for, folded to lower case without accents by the program.
-- last_action: the newest action that concerns the row, so that lists begin with the newest.
CREATE TABLE customer (
  id           UUID NOT NULL,
  version      INTEGER NOT NULL,
  name         VARCHAR(1000) NOT NULL,
  phone        VARCHAR(1000) NOT NULL,
  email        VARCHAR(1000) NOT NULL,
  note         VARCHAR(20000) NOT NULL,
  search_key   VARCHAR(200000) NOT NULL,
  last_action  BIGINT NOT NULL,
  CONSTRAINT customer_key PRIMARY KEY (id),
  CONSTRAINT customer_action FOREIGN KEY (last_action) REFERENCES action (sequence)
);

CREATE TABLE instrument (
  id                   UUID NOT NULL,
  version              INTEGER NOT NULL,
  customer_id          UUID,
  kind                 VARCHAR(40) NOT NULL,
  maker                VARCHAR(1000) NOT NULL,
  model                VARCHAR(1000) NOT NULL,
  serial               VARCHAR(1000) NOT NULL,
  tag                  VARCHAR(1000) NOT NULL,
  strings              INTEGER NOT NULL,
  scale_treble_mm      DOUBLE PRECISION NOT NULL,
  scale_bass_mm        DOUBLE PRECISION NOT NULL,
  frets                INTEGER NOT NULL,
  radius_mm            DOUBLE PRECISION,
  left_handed          BOOLEAN NOT NULL,
  saddle_kind          VARCHAR(40) NOT NULL,
  screw_pitch_mm       DOUBLE PRECISION,
  screw_sense          VARCHAR(40) NOT NULL,
  saddle_thickness_mm  DOUBLE PRECISION,
  search_key           VARCHAR(200000) NOT NULL,
  last_action          BIGINT NOT NULL,
  CONSTRAINT instrument_key PRIMARY KEY (id),
  CONSTRAINT instrument_customer FOREIGN KEY (customer_id) REFERENCES customer (id),
  CONSTRAINT instrument_action FOREIGN KEY (last_action) REFERENCES action (sequence)
);
CREATE INDEX instrument_by_customer ON instrument (customer_id);
CREATE INDEX instrument_by_action ON instrument (last_action);

CREATE TABLE string_set (
  id       UUID NOT NULL,
  version  INTEGER NOT NULL,
  name     VARCHAR(1000) NOT NULL,
  CONSTRAINT string_set_key PRIMARY KEY (id)
);

CREATE TABLE string_set_string (
  set_id           UUID NOT NULL,
  string_number    INTEGER NOT NULL,
  gauge_in         DOUBLE PRECISION NOT NULL,
  construction     VARCHAR(40) NOT NULL,
  core_in          DOUBLE PRECISION,
  unit_mass_g_m    DOUBLE PRECISION,
  CONSTRAINT string_set_string_key PRIMARY KEY (set_id, string_number),
  CONSTRAINT string_set_string_set FOREIGN KEY (set_id) REFERENCES string_set (id)
);

CREATE TABLE visit (
  id              UUID NOT NULL,
  version         INTEGER NOT NULL,
  ticket          INTEGER NOT NULL,
  instrument_id   UUID NOT NULL,
  customer_id     UUID,
  taken_in        DATE NOT NULL,
  taken_in_by     VARCHAR(1000) NOT NULL,
  promised        DATE,
  request         VARCHAR(20000) NOT NULL,
  condition_seen  VARCHAR(20000) NOT NULL,
  temperature_c   DOUBLE PRECISION,
  humidity_pct    DOUBLE PRECISION,
  set_name        VARCHAR(1000) NOT NULL,
  fitted_on       DATE,
  tuning_name     VARCHAR(1000) NOT NULL,
  reference_hz    DOUBLE PRECISION NOT NULL,
  handed_out      DATE,
  CONSTRAINT visit_key PRIMARY KEY (id),
  CONSTRAINT visit_ticket UNIQUE (ticket),
  CONSTRAINT visit_instrument FOREIGN KEY (instrument_id) REFERENCES instrument (id),
  CONSTRAINT visit_customer FOREIGN KEY (customer_id) REFERENCES customer (id)
);
CREATE INDEX visit_by_instrument ON visit (instrument_id);
CREATE INDEX visit_by_customer ON visit (customer_id);
CREATE INDEX visit_by_day_out ON visit (handed_out);

-- The strings on the instrument during the visit, as they were at that time.
CREATE TABLE fitted_string (
  visit_id       UUID NOT NULL,
  item           INTEGER NOT NULL,
  string_number  INTEGER NOT NULL,
  pitch_typed    VARCHAR(1000) NOT NULL,
  pitch_hz       DOUBLE PRECISION NOT NULL,
  scale_mm       DOUBLE PRECISION NOT NULL,
  gauge_in       DOUBLE PRECISION NOT NULL,
  construction   VARCHAR(40) NOT NULL,
  core_in        DOUBLE PRECISION,
  unit_mass_g_m  DOUBLE PRECISION,
  CONSTRAINT fitted_string_key PRIMARY KEY (visit_id, item),
  CONSTRAINT fitted_string_number UNIQUE (visit_id, string_number),
  CONSTRAINT fitted_string_visit FOREIGN KEY (visit_id) REFERENCES visit (id)
);

-- Room at a saddle as received.
CREATE TABLE saddle_travel (
  visit_id       UUID NOT NULL,
  item           INTEGER NOT NULL,
  string_number  INTEGER NOT NULL,
  back_mm        DOUBLE PRECISION,
  forward_mm     DOUBLE PRECISION,
  CONSTRAINT saddle_travel_key PRIMARY KEY (visit_id, item),
  CONSTRAINT saddle_travel_number UNIQUE (visit_id, string_number),
  CONSTRAINT saddle_travel_visit FOREIGN KEY (visit_id) REFERENCES visit (id)
);

-- What follows is only ever added to. A row is known by the action that wrote it and its place
-- in it, which is also the order in which it was made.

CREATE TABLE bench_check (
  action_sequence  BIGINT NOT NULL,
  item             INTEGER NOT NULL,
  visit_id         UUID NOT NULL,
  kind             VARCHAR(40) NOT NULL,
  string_number    INTEGER NOT NULL,
  fret             INTEGER NOT NULL,
  method           VARCHAR(40) NOT NULL,
  moment           VARCHAR(40) NOT NULL,
  value_mm         DOUBLE PRECISION NOT NULL,
  typed            VARCHAR(1000) NOT NULL,
  CONSTRAINT bench_check_key PRIMARY KEY (action_sequence, item),
  CONSTRAINT bench_check_action FOREIGN KEY (action_sequence) REFERENCES action (sequence),
  CONSTRAINT bench_check_visit FOREIGN KEY (visit_id) REFERENCES visit (id)
);
CREATE INDEX bench_check_by_visit ON bench_check (visit_id);

CREATE TABLE reading (
  action_sequence  BIGINT NOT NULL,
  item             INTEGER NOT NULL,
  visit_id         UUID NOT NULL,
  pass             INTEGER NOT NULL,
  string_number    INTEGER NOT NULL,
  fret             INTEGER NOT NULL,
  against          VARCHAR(40) NOT NULL,
  sd_cents         DOUBLE PRECISION NOT NULL,
  read_at          TIMESTAMP(6) WITH TIME ZONE NOT NULL,
  CONSTRAINT reading_key PRIMARY KEY (action_sequence, item),
  CONSTRAINT reading_action FOREIGN KEY (action_sequence) REFERENCES action (sequence),
  CONSTRAINT reading_visit FOREIGN KEY (visit_id) REFERENCES visit (id)
);
CREATE INDEX reading_by_visit ON reading (visit_id);

-- The tries of a reading; none where a reading takes back what was read before. The decimals are
-- kept because 5 and 5.0 say different things about the tuner.
CREATE TABLE reading_try (
  action_sequence  BIGINT NOT NULL,
  item             INTEGER NOT NULL,
  try_number       INTEGER NOT NULL,
  cents            DOUBLE PRECISION NOT NULL,
  decimals         INTEGER NOT NULL,
  CONSTRAINT reading_try_key PRIMARY KEY (action_sequence, item, try_number),
  CONSTRAINT reading_try_reading FOREIGN KEY (action_sequence, item)
    REFERENCES reading (action_sequence, item)
);

CREATE TABLE made_move (
  action_sequence  BIGINT NOT NULL,
  item             INTEGER NOT NULL,
  visit_id         UUID NOT NULL,
  pass             INTEGER NOT NULL,
  string_number    INTEGER NOT NULL,
  saddle_mm        DOUBLE PRECISION NOT NULL,
  turns            DOUBLE PRECISION,
  nut_mm           DOUBLE PRECISION,
  made_at          TIMESTAMP(6) WITH TIME ZONE NOT NULL,
  CONSTRAINT made_move_key PRIMARY KEY (action_sequence, item),
  CONSTRAINT made_move_action FOREIGN KEY (action_sequence) REFERENCES action (sequence),
  CONSTRAINT made_move_visit FOREIGN KEY (visit_id) REFERENCES visit (id)
);
CREATE INDEX made_move_by_visit ON made_move (visit_id);

CREATE TABLE work_line (
  action_sequence  BIGINT NOT NULL,
  visit_id         UUID NOT NULL,
  done_at          TIMESTAMP(6) WITH TIME ZONE NOT NULL,
  technician       VARCHAR(1000) NOT NULL,
  work_text        VARCHAR(20000) NOT NULL,
  CONSTRAINT work_line_key PRIMARY KEY (action_sequence),
  CONSTRAINT work_line_action FOREIGN KEY (action_sequence) REFERENCES action (sequence),
  CONSTRAINT work_line_visit FOREIGN KEY (visit_id) REFERENCES visit (id)
);
CREATE INDEX work_line_by_visit ON work_line (visit_id);

CREATE TABLE visit_note (
  action_sequence  BIGINT NOT NULL,
  visit_id         UUID NOT NULL,
  written_at       TIMESTAMP(6) WITH TIME ZONE NOT NULL,
  kind             VARCHAR(40) NOT NULL,
  note_text        VARCHAR(20000) NOT NULL,
  CONSTRAINT visit_note_key PRIMARY KEY (action_sequence),
  CONSTRAINT visit_note_action FOREIGN KEY (action_sequence) REFERENCES action (sequence),
  CONSTRAINT visit_note_visit FOREIGN KEY (visit_id) REFERENCES visit (id)
);
CREATE INDEX visit_note_by_visit ON visit_note (visit_id);
