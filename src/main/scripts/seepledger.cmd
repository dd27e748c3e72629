@echo off
rem Runs seepledger from wherever this script lies, with the jar and lib\ beside it.
java %SEEPLEDGER_JAVA_OPTIONS% -jar "%~dp0seepledger.jar" %*
