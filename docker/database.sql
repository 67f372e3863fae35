-- The database belongs to the role that migrates it.
alter database coastdown owner to coastdown_owner;
