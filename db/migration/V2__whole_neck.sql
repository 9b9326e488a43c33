-- What a visit is reckoned for, and from when on an instrument's readings teach something. Both are
-- only ever added to; the newest row holds. aim: octave, neck, or frets with weights, 1 5 7 12:2.

CREATE TABLE visit_aim (
  action_sequence  BIGINT NOT NULL,
  visit_id         UUID NOT NULL,
  aim              VARCHAR(1000) NOT NULL,
  nut              VARCHAR(40) NOT NULL,
  CONSTRAINT visit_aim_key PRIMARY KEY (action_sequence),
  CONSTRAINT visit_aim_action FOREIGN KEY (action_sequence) REFERENCES action (sequence),
  CONSTRAINT visit_aim_visit FOREIGN KEY (visit_id) REFERENCES visit (id)
);
CREATE INDEX visit_aim_by_visit ON visit_aim (visit_id);

CREATE TABLE learning_reset (
  action_sequence  BIGINT NOT NULL,
  instrument_id    UUID NOT NULL,
  learned_from     TIMESTAMP(6) WITH TIME ZONE NOT NULL,
  CONSTRAINT learning_reset_key PRIMARY KEY (action_sequence),
  CONSTRAINT learning_reset_action FOREIGN KEY (action_sequence) REFERENCES action (sequence),
  CONSTRAINT learning_reset_instrument FOREIGN KEY (instrument_id) REFERENCES instrument (id)
);
CREATE INDEX learning_reset_by_instrument ON learning_reset (instrument_id);
