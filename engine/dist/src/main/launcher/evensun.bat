@echo off
rem Starts Evensun from the folder it was unpacked to, from any working directory.
setlocal
set "EVENSUN_HOME=%~dp0.."

set "JAVA_EXE="
if defined JAVA_HOME if exist "%JAVA_HOME%\bin\java.exe" set "JAVA_EXE=%JAVA_HOME%\bin\java.exe"
if not defined JAVA_EXE for %%J in (java.exe) do set "JAVA_EXE=%%~$PATH:J"
if not defined JAVA_EXE (
  echo evensun: needs Java 17 or newer but found none in JAVA_HOME or PATH; install one, or set JAVA_HOME to its folder 1>&2
  exit /b 1
)

rem An older Java does not know this option; the program itself could only fail with a riddle.
"%JAVA_EXE%" -XX:+UseSerialGC --version >nul 2>&1
if errorlevel 1 goto tooold
for /f "tokens=2 delims=. " %%V in ('"%JAVA_EXE%" --version 2^>nul ^| findstr /r "^[a-z]* [0-9]"') do set "JAVA_FEATURE=%%V"
if %JAVA_FEATURE% LSS 17 goto tooold

"%JAVA_EXE%" -XX:-UsePerfData -Xshare:auto "@%~dp0search.options" -Dfile.encoding=UTF-8 "-Devensun.home=%EVENSUN_HOME%" %EVENSUN_JAVA_OPTS% -cp "%EVENSUN_HOME%\lib\*" evensun.cli.Main %*
exit /b %ERRORLEVEL%

:tooold
echo evensun: needs Java 17 or newer but "%JAVA_EXE%" is older; install one and set JAVA_HOME to its folder 1>&2
exit /b 1
