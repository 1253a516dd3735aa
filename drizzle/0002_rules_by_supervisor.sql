-- A supervisor states the plant's rules from the office: the application adds revisions, and as ever changes none.
GRANT INSERT ON plant_rules TO cogmark_app;
