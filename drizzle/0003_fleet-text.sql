CREATE VIRTUAL TABLE `fleet_text` USING fts5(`words`, content='', contentless_delete=1, tokenize='unicode61 remove_diacritics 0', prefix='2 3');--> statement-breakpoint
CREATE TRIGGER `fleet_row_added` AFTER INSERT ON `fleet_row` BEGIN
  UPDATE `fleet_row` SET `no` = (SELECT coalesce(max(`no`), 0) + 1 FROM `fleet_row`) WHERE `producer_id` = new.`producer_id` AND `id` = new.`id`;
  INSERT INTO `fleet_text` (`rowid`, `words`) SELECT `no`, `words` FROM `fleet_row` WHERE `producer_id` = new.`producer_id` AND `id` = new.`id`;
END;--> statement-breakpoint
CREATE TRIGGER `fleet_row_reworded` AFTER UPDATE OF `words` ON `fleet_row` WHEN old.`words` <> new.`words` BEGIN
  DELETE FROM `fleet_text` WHERE `rowid` = old.`no`;
  INSERT INTO `fleet_text` (`rowid`, `words`) VALUES (new.`no`, new.`words`);
END;--> statement-breakpoint
CREATE TRIGGER `fleet_row_gone` AFTER DELETE ON `fleet_row` BEGIN
  DELETE FROM `fleet_text` WHERE `rowid` = old.`no`;
END;
