parser grammar Statement;
tokens { NUMBER }
statement: NUMBER EOF;
