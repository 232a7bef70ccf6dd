@echo off
rem Starts Irreproof. Java is looked for in IRREPROOF_JAVA_HOME, then JAVA_HOME, then on PATH.
rem IRREPROOF_JAVA_OPTS: further options for the Java VM.
setlocal
set "LIB=%~dp0..\lib"
set "JAVA=java"
if exist "%JAVA_HOME%\bin\java.exe" set "JAVA=%JAVA_HOME%\bin\java.exe"
if exist "%IRREPROOF_JAVA_HOME%\bin\java.exe" set "JAVA=%IRREPROOF_JAVA_HOME%\bin\java.exe"
if not "%JAVA%"=="java" goto start
where java >nul 2>nul
if not errorlevel 1 goto start
echo irreproof: no Java found: install Java 17 or newer, or set JAVA_HOME>&2
exit /b 127
:start
set "TIERS=-XX:TieredStopAtLevel=1"
if "%~1"=="serve" set "TIERS="
"%JAVA%" -Xlog:disable -Xlog:all=error:stderr -XX:+UseSerialGC %TIERS% -Xshare:auto "-XX:SharedArchiveFile=%LIB%\irreproof.jsa" %IRREPROOF_JAVA_OPTS% -jar "%LIB%\irreproof.jar" %*
exit /b %ERRORLEVEL%
